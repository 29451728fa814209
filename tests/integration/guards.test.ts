import { createHash } from 'node:crypto';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';

let database: TestDatabase;
let app: pg.Client;
let owner: pg.Client;

const sha256 = (content: string) => createHash('sha256').update(content).digest('hex');
const refused = { code: '42501' };

/** Cases by their place on the list; each test has one for itself. */
const caseAt = async (position: number): Promise<{ id: string; unit_id: string }> => {
  const { rows } = await app.query('select id, unit_id from cases where position = $1', [position]);
  return rows[0];
};

const signedVersion = async (
  caseId: string,
  { version = 1, canonical = '{}', sha = sha256('{}'), docxSha = sha256('docx') } = {},
): Promise<string> => {
  const { rows } = await app.query(
    `insert into signed_versions
       (case_id, version, canonical, sha256, verification_code, signer_id, signed_at, docx, docx_sha256)
     select $1, $2, $3, $4, 'AAA-AAA-AAA-AAA', id, now(), 'docx', $5 from people limit 1 returning id`,
    [caseId, version, canonical, sha, docxSha],
  );
  return rows[0].id;
};

beforeAll(async () => {
  database = await createTestDatabase({ demonstration: true });
  app = new pg.Client({ connectionString: database.url });
  owner = new pg.Client({ connectionString: database.ownerUrl });
  await Promise.all([app.connect(), owner.connect()]);
});

afterAll(async () => {
  await Promise.all([app?.end(), owner?.end()]);
  await database?.drop();
});

describe('a case', () => {
  it('is not signed without what was signed', async () => {
    const { id } = await caseAt(1);
    await expect(app.query("update cases set state = 'signed' where id = $1", [id])).rejects.toMatchObject(
      refused,
    );
  });

  it('begins as a draft', async () => {
    const { unit_id } = await caseAt(1);
    await expect(
      app.query(
        "insert into cases (unit_id, list_date, position, record, state) values ($1, now(), 9, '{}', 'signed')",
        [unit_id],
      ),
    ).rejects.toMatchObject(refused);
  });

  it('is signed as it stands, once, and never changed again', async () => {
    const { id } = await caseAt(2);
    await signedVersion(id);
    for (const change of [
      "record = '{}'",
      "answers = '[{}]'",
      'revision = revision + 1',
      "sheet = '{}'",
      'saved_at = now()',
    ]) {
      await expect(
        app.query(`update cases set state = 'signed', ${change} where id = $1`, [id]),
      ).rejects.toMatchObject(refused);
    }
    await app.query("update cases set state = 'signed' where id = $1", [id]);
    await expect(signedVersion(id, { version: 2 })).rejects.toMatchObject(refused);
    for (const client of [app, owner]) {
      await expect(
        client.query("update cases set state = 'draft' where id = $1", [id]),
      ).rejects.toMatchObject(refused);
      await expect(client.query('delete from cases where id = $1', [id])).rejects.toMatchObject(refused);
    }
    await expect(owner.query('truncate cases cascade')).rejects.toMatchObject(refused);
  });
});

describe('what is signed', () => {
  it('carries the hashes of its text and its document', async () => {
    const { id } = await caseAt(3);
    await expect(signedVersion(id, { canonical: '{"a":1}' })).rejects.toMatchObject(refused);
    await expect(signedVersion(id, { docxSha: sha256('other') })).rejects.toMatchObject(refused);
    const signed = await signedVersion(id, { canonical: '{"a":"é"}', sha: sha256('{"a":"é"}') });
    const add = (canonical: string) =>
      app.query(
        `insert into addenda (signed_version_id, number, canonical, sha256, verification_code, signer_id, signed_at)
         select $1, 1, $2, $3, 'AAA-AAA-AAA-AAA', id, now() from people limit 1`,
        [signed, canonical, sha256('{}')],
      );
    await expect(add('{"b":1}')).rejects.toMatchObject(refused);
    await add('{}');
    await expect(app.query("update addenda set canonical = '[]'")).rejects.toMatchObject(refused);
  });

  it('is guarded also where a temporary table takes a name', async () => {
    const { id } = await caseAt(4);
    await app.query('create temporary table signed_versions as select $1::uuid as case_id', [id]);
    await expect(app.query("update cases set state = 'signed' where id = $1", [id])).rejects.toMatchObject(
      refused,
    );
    await app.query('drop table pg_temp.signed_versions');
  });
});

describe('the log', () => {
  const append = (position: string, previous: string, hash = 'a'.repeat(64)) =>
    app.query(
      `insert into audit_log (position, at, action, subject, detail, previous_hash, hash)
       select ${position}, now(), 'x', 'x', '{}', ${previous}, $1 from audit_log order by position desc limit 1`,
      [hash],
    );

  it('grows at its end only, each entry on the one before', async () => {
    await expect(append('position + 2', 'hash')).rejects.toMatchObject(refused);
    await expect(append('position', 'hash')).rejects.toMatchObject(refused);
    await expect(append('0', "repeat('0', 64)")).rejects.toMatchObject(refused);
    await expect(append('position + 1', "repeat('0', 64)")).rejects.toMatchObject(refused);
    await expect(append('position + 1', 'hash', 'no hash')).rejects.toMatchObject(refused);
    await append('position + 1', 'hash');
  });
});
