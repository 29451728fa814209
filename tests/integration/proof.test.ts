import { readFileSync } from 'node:fs';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { type Person, signInAs } from '../support/person.ts';
import { startServer, type TestServer } from '../support/server.ts';

let database: TestDatabase;
let server: TestServer;
let owner: pg.Client;
let surgeon: Person;
let auditor: Person;
let signedId: string;

const password = 'demonstration-surgeon';

beforeAll(async () => {
  database = await createTestDatabase({ demonstration: true });
  server = await startServer({ database });
  owner = new pg.Client({ connectionString: database.ownerUrl });
  await owner.connect();
  surgeon = await signInAs(server.url, 'surgeon');
  auditor = await signInAs(server.url, 'auditor');
  const { rows } = await owner.query('select id from cases where position = 2');
  const record: unknown = JSON.parse(
    readFileSync(new URL('../fixtures/vitrectomy-with-gas.json', import.meta.url), 'utf8'),
  );
  const sheet = { title: 'Operative note', sections: [] };
  const path = `/api/cases/${rows[0].id}`;
  expect((await surgeon.send('PUT', path, { record, sheet, answers: [] }, 1)).status).toBe(200);
  const signed = await surgeon.send('POST', `${path}/sign`, { password, meaning: 'author' }, 2);
  expect(signed.status).toBe(200);
  signedId = (await signed.json()).signedVersionId;
});

afterAll(async () => {
  await owner?.end();
  await server?.stop();
  await database?.drop();
});

/** What does not hold, as the auditor's page says. */
const doesNotHold = async (): Promise<string[]> => {
  const page = await (await auditor.get(`/auditing/${signedId}`)).text();
  expect(page.includes('This is what was signed')).toBe(!page.includes('DOES NOT HOLD'));
  return [...page.matchAll(/DOES NOT HOLD<\/strong> · ([^<]+)/g)].map(([, title = '']) => title.trim());
};

const guarded = ['signed_versions', 'addenda', 'audit_log'];

/** The same after a change behind the guards, which is then taken back. */
const doesNotHoldAfter = async (...changes: string[]): Promise<string[]> => {
  for (const table of guarded) {
    await owner.query(`create table kept_${table} as table ${table}`);
    await owner.query(`alter table ${table} disable trigger user`);
  }
  for (const change of changes) await owner.query(change);
  const found = await doesNotHold();
  // Reading is logged too: what was added meanwhile goes with the rest.
  await owner.query('delete from audit_log');
  await owner.query('insert into audit_log table kept_audit_log');
  await owner.query('delete from addenda');
  await owner.query('insert into addenda table kept_addenda');
  await owner.query(
    `update signed_versions set (canonical, sha256, verification_code, signed_at, docx, docx_sha256) =
       (select k.canonical, k.sha256, k.verification_code, k.signed_at, k.docx, k.docx_sha256 from kept_signed_versions k)`,
  );
  for (const table of guarded) {
    await owner.query(`alter table ${table} enable trigger user`);
    await owner.query(`drop table kept_${table}`);
  }
  return found;
};

const hash = 'The log holds one signature, with the SHA-256 of text and document';
const stored = 'Its SHA-256 is the one stored at signature';
const label = 'Case, version, time and verification code are those of the text';
const added = 'The log holds the SHA-256 of each addendum, and of no other';
const chain = 'The chain of the log is unbroken';
const hex = (text: string) => `encode(sha256(convert_to(${text}, 'UTF8')), 'hex')`;

describe('what is added to a note', () => {
  it('is numbered one after the other when two are signed at once', async () => {
    const add = (text: string) =>
      surgeon.post(`/signed/${signedId}`, { reason: 'Came up later', text, password });
    const answers = await Promise.all([add('The first.'), add('The second.')]);
    expect(answers.map(({ status }) => status)).toEqual([303, 303]);
    const { rows } = await owner.query('select number from addenda order by number');
    expect(rows).toEqual([{ number: 1 }, { number: 2 }]);
  });

  it('is refused when it is too long, instead of cut', async () => {
    const answer = await surgeon.post(`/signed/${signedId}`, {
      reason: 'Came up later',
      text: 'a'.repeat(8001),
      password,
    });
    expect(answer.status).toBe(422);
    expect(await answer.text()).toContain('at most 8000 characters');
  });
});

describe('the proof of a note', () => {
  it('holds as it was signed and added to', async () => {
    expect(await doesNotHold()).toEqual([]);
  });

  it.each([
    [
      'the text',
      ["update signed_versions set canonical = replace(canonical, 'left', 'right')"],
      [stored, label, hash],
    ],
    [
      'the text and its hash',
      [
        "update signed_versions set canonical = replace(canonical, 'left', 'right')",
        `update signed_versions set sha256 = ${hex('canonical')}`,
      ],
      [label, hash],
    ],
    ['the time', ["update signed_versions set signed_at = signed_at - interval '1 hour'"], [label]],
    ['the code', ["update signed_versions set verification_code = 'AAA-AAA-AAA-AAA'"], [label]],
    [
      'the document and its hash',
      ["update signed_versions set docx = 'x', docx_sha256 = encode(sha256('x'), 'hex')"],
      [hash],
    ],
    [
      'an addendum and its hash',
      [
        `update addenda set canonical = replace(canonical, 'Came up later', 'Known before') where number = 1`,
        `update addenda set sha256 = ${hex('canonical')} where number = 1`,
      ],
      [added],
    ],
    ['an addendum taken out', ['delete from addenda where number = 2'], [added]],
    [
      'the signature taken out of the log',
      ["delete from audit_log where action = 'note:signed'"],
      [hash, chain],
    ],
    ['the log', ["update audit_log set subject = 'x' where position = 1"], [chain]],
  ])('shows a change of %s', async (_, changes, expected) => {
    expect(await doesNotHoldAfter(...changes)).toEqual(expected);
    expect(await doesNotHold()).toEqual([]);
  });
});
