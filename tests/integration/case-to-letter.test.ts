import { readFileSync } from 'node:fs';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CaseRecord } from '../../src/domain/record/schema.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { type Person, signInAs } from '../support/person.ts';
import { startServer, type TestServer } from '../support/server.ts';

let database: TestDatabase;
let server: TestServer;
let owner: pg.Client;
let app: pg.Client;
/** How often the family doctor's mail server has asked to come back later. */
let busyTimes = 0;
let surgeon: Person;
let secretary: Person;

const fixture = (): CaseRecord => ({
  ...JSON.parse(readFileSync(new URL('../fixtures/vitrectomy-with-gas.json', import.meta.url), 'utf8')),
});
const emptySheet = { title: 'Operative note', sections: [] };
const password = 'demonstration-surgeon';

const caseAt = async (position: number): Promise<string> => {
  const { rows } = await owner.query('select id from cases where position = $1', [position]);
  return rows[0].id;
};

const sign = (id: string, revision: number, typed = password) =>
  surgeon.send('POST', `/api/cases/${id}/sign`, { password: typed, meaning: 'author' }, revision);

const until = async (holds: () => Promise<boolean>): Promise<void> => {
  const limit = Date.now() + 40_000;
  while (!(await holds())) {
    if (Date.now() > limit) throw new Error('This did not happen in time.');
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
};

beforeAll(async () => {
  database = await createTestDatabase({ demonstration: true });
  server = await startServer({
    database,
    instances: 2,
    refuse: (address) => {
      if (address.startsWith('bram')) return { code: 550, message: 'no such person' };
      if (!address.startsWith('hazel') || busyTimes >= 1) return undefined;
      busyTimes += 1;
      return { code: 451, message: 'try later' };
    },
  });
  owner = new pg.Client({ connectionString: database.ownerUrl });
  app = new pg.Client({ connectionString: database.url });
  await Promise.all([owner.connect(), app.connect()]);
  [surgeon, secretary] = await Promise.all([
    signInAs(server.url, 'surgeon'),
    signInAs(server.url, 'secretary'),
  ]);
});

afterAll(async () => {
  await Promise.all([owner?.end(), app?.end()]);
  await server?.stop();
  await database?.drop();
});

describe('saving', () => {
  it('keeps both when two people save upon the same revision', async () => {
    const id = await caseAt(5);
    const save = (given: string) =>
      surgeon.send(
        'PUT',
        `/api/cases/${id}`,
        { record: { version: 1, who: { theatre: given } }, sheet: emptySheet, answers: [] },
        1,
      );
    const answers = await Promise.all([save('One'), save('Two')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412]);
    const lost = answers.find(({ status }) => status === 412);
    expect(await lost?.json()).toMatchObject({ code: 'stale', current: { revision: 2 } });
    const { rows } = await owner.query(
      'select count(*)::int as kept from case_revisions where case_id = $1',
      [id],
    );
    expect(rows[0].kept).toBe(2);
  });

  it('shows who changed what between two revisions', async () => {
    const id = await caseAt(5);
    const page = await (await surgeon.get(`/cases/${id}/history`)).text();
    expect(page).toContain('A. Surgeon');
    expect(page).toMatch(/Theatre<\/td>[\s\S]*<del>nothing<\/del>[\s\S]*<ins>(?:One|Two)<\/ins>/);
  });

  it('says where a record does not fit, and asks for the revision', async () => {
    const id = await caseAt(4);
    const wrong = { record: { version: 1, who: { eye: 'both' } }, sheet: emptySheet, answers: [] };
    const refused = await surgeon.send('PUT', `/api/cases/${id}`, wrong, 1);
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ code: 'invalid', issues: [{ path: 'record.who.eye' }] });
    expect((await surgeon.send('PUT', `/api/cases/${id}`, wrong)).status).toBe(428);
  });
});

describe('signing', () => {
  it('is refused while a contradiction stands, and with a wrong password', async () => {
    const id = await caseAt(3);
    const record = fixture();
    const twisted = {
      ...record,
      who: { ...record.who, consentEye: record.who?.eye === 'left' ? 'right' : 'left' },
    };
    await surgeon.send('PUT', `/api/cases/${id}`, { record: twisted, sheet: emptySheet, answers: [] }, 1);
    const blocked = await sign(id, 2);
    expect(blocked.status).toBe(409);
    expect(await blocked.json()).toMatchObject({ code: 'blocked', flags: [{ rule: 'side-differs' }] });
    expect((await sign(id, 2, 'wrong')).status).toBe(401);
  });

  it('freezes the note in one step, and nobody can change it afterwards', async () => {
    const id = await caseAt(2);
    const record = fixture();
    const named = {
      ...record,
      who: { ...record.who, referrer: { name: 'Fern Mossgrove', kind: 'optometrist' as const } },
    };
    await surgeon.send('PUT', `/api/cases/${id}`, { record: named, sheet: emptySheet, answers: [] }, 1);
    expect((await sign(id, 1)).status).toBe(412);
    const signed = await sign(id, 2);
    expect(signed.status).toBe(200);
    expect(await signed.json()).toMatchObject({
      version: 1,
      verificationCode: expect.stringMatching(/^(\w{3}-){3}\w{3}$/),
    });
    expect((await sign(id, 2)).status).toBe(409);
    expect(
      (await surgeon.send('PUT', `/api/cases/${id}`, { record: named, sheet: emptySheet, answers: [] }, 2))
        .status,
    ).toBe(409);

    const refused = { code: '42501' };
    for (const client of [app, owner]) {
      await expect(client.query("update signed_versions set sha256 = 'x'")).rejects.toMatchObject(refused);
      await expect(client.query('delete from signed_versions')).rejects.toMatchObject(refused);
      await expect(client.query("update audit_log set action = 'x'")).rejects.toMatchObject(refused);
      await expect(client.query('delete from case_revisions')).rejects.toMatchObject(refused);
      await expect(client.query("update cases set record = '{}' where id = $1", [id])).rejects.toMatchObject(
        refused,
      );
    }
    await expect(owner.query('truncate audit_log')).rejects.toMatchObject(refused);
  });

  it('is proved on the spot, and a change behind the guards is seen', async () => {
    const auditor = await signInAs(server.url, 'auditor');
    const { rows } = await owner.query('select id from signed_versions');
    const page = async () => (await auditor.get(`/auditing/${rows[0].id}`)).text();
    expect(await page()).toContain('This is what was signed');
    await owner.query('alter table audit_log disable trigger all');
    await owner.query("update audit_log set action = 'nothing' where position = 2");
    expect(await page()).toContain('DOES NOT HOLD');
    await owner.query("update audit_log set action = 'person:signed-in' where position = 2");
    await owner.query('alter table audit_log enable trigger all');
  });

  it('is added to without being touched, and only with the password', async () => {
    const { rows } = await owner.query('select id, sha256 from signed_versions');
    const path = `/signed/${rows[0].id}`;
    const add = (typed: string) =>
      surgeon.post(path, {
        reason: 'pathology came back',
        text: 'The membrane was benign.',
        password: typed,
      });
    expect((await add('wrong')).status).toBe(422);
    expect((await add(password)).status).toBe(303);
    const page = await (await surgeon.get(path)).text();
    expect(page).toContain('The membrane was benign.');
    expect(page).toContain('Because: pathology came back');
    const after = await owner.query('select sha256 from signed_versions');
    expect(after.rows).toEqual([{ sha256: rows[0].sha256 }]);
    await expect(app.query("update addenda set canonical = '{}'")).rejects.toMatchObject({ code: '42501' });
  });

  it('logs that a note was read', async () => {
    const { rows } = await owner.query(
      "select count(*)::int as reads from audit_log where action = 'note:read'",
    );
    expect(rows[0].reads).toBeGreaterThan(0);
  });
});

describe('letters', () => {
  const letterOf = async (kind: string): Promise<{ id: string; revision: number; sheet: unknown }> => {
    const { rows } = await owner.query('select id, revision, sheet from letters where kind = $1', [kind]);
    return rows[0];
  };
  const readerId = async (name: string): Promise<string> => {
    const { rows } = await owner.query('select id from recipients where name = $1', [name]);
    return rows[0].id;
  };
  const stateOf = async (id: string) => {
    const { rows } = await owner.query('select state, last_error from letters where id = $1', [id]);
    return rows[0];
  };

  it('go nowhere without a confirmed reader, and not with words against the note', async () => {
    const { id, revision, sheet } = await letterOf('referring-doctor');
    expect(
      await (await secretary.send('POST', `/api/letters/${id}/send`, {}, revision)).json(),
    ).toMatchObject({ code: 'no-recipient' });
    const unconfirmed = await readerId('Dr Perrin Alderbank');
    await secretary.send('PUT', `/api/letters/${id}`, { sheet, recipientId: unconfirmed }, revision);
    expect(
      await (await secretary.send('POST', `/api/letters/${id}/send`, {}, revision + 1)).json(),
    ).toMatchObject({ code: 'not-confirmed' });
    const wrong = {
      title: 'Letter',
      sections: [
        {
          id: 's',
          heading: 'S',
          statements: [
            {
              id: 'x',
              origin: 'own',
              text: 'Surgery to the right eye. Surgery to the left eye.',
              drafted: '',
              reads: [],
            },
          ],
        },
      ],
    };
    const fern = await readerId('Fern Mossgrove');
    await secretary.send('PUT', `/api/letters/${id}`, { sheet: wrong, recipientId: fern }, revision + 1);
    expect(
      await (await secretary.send('POST', `/api/letters/${id}/send`, {}, revision + 2)).json(),
    ).toMatchObject({ code: 'denied' });
    expect(
      (await secretary.send('PUT', `/api/letters/${id}`, { sheet, recipientId: fern }, revision + 2)).status,
    ).toBe(200);
  });

  it('arrive once, with one Message-ID, without patient data in subject or file name', async () => {
    const { id, revision } = await letterOf('referring-doctor');
    const twice = await Promise.all([
      secretary.send('POST', `/api/letters/${id}/send`, {}, revision),
      secretary.send('POST', `/api/letters/${id}/send`, {}, revision),
    ]);
    expect(twice.map(({ status }) => status).sort()).toEqual([200, 409]);
    await until(async () => (await stateOf(id)).state === 'sent');
    const messages = server.messages();
    expect(messages).toHaveLength(1);
    const { rows } = await owner.query('select message_id from letters where id = $1', [id]);
    expect(messages[0]).toContain(`Message-ID: ${rows[0].message_id}`);
    const head = messages[0]?.slice(0, messages[0].indexOf('base64')) ?? '';
    const patient = fixture().who?.patient;
    for (const secret of [patient?.familyName, patient?.givenName, patient?.number])
      expect(head).not.toContain(secret);
    expect(head).toContain('Subject: Letter from Larkfield Eye Unit');
  });

  it('come back to the desk with a reason when they are refused, and go by themselves when a mail server was only busy', async () => {
    const { id, revision, sheet } = await letterOf('family-doctor');
    const sendTo = async (name: string, upon: number) => {
      await secretary.send('PUT', `/api/letters/${id}`, { sheet, recipientId: await readerId(name) }, upon);
      expect((await secretary.send('POST', `/api/letters/${id}/send`, {}, upon + 1)).status).toBe(200);
    };
    await sendTo('Bram Larkwood', revision);
    await until(async () => (await stateOf(id)).state === 'failed');
    expect((await stateOf(id)).last_error).toContain('Check the address');
    await sendTo('Dr Hazel Underwillow', revision + 1);
    await until(async () => (await stateOf(id)).state === 'sent');
    expect(busyTimes).toBe(1);
    const { rows } = await owner.query('select attempts from letters where id = $1', [id]);
    expect(rows[0].attempts).toBe(3);
  });

  it('to the patient go on paper, not to somebody in the directory', async () => {
    const { id, revision, sheet } = await letterOf('patient');
    const fern = await readerId('Fern Mossgrove');
    await secretary.send('PUT', `/api/letters/${id}`, { sheet, recipientId: fern }, revision);
    const mailed = await secretary.send('POST', `/api/letters/${id}/send`, {}, revision + 1);
    expect(await mailed.json()).toMatchObject({ code: 'no-recipient' });
    await secretary.send('PUT', `/api/letters/${id}`, { sheet, recipientId: null }, revision + 1);
    const handed = await secretary.send('POST', `/api/letters/${id}/send`, { by: 'paper' }, revision + 2);
    expect(handed.status).toBe(200);
    const view = await (await secretary.get(`/api/letters/${id}`)).json();
    expect(view).toMatchObject({ state: 'sent', sentTo: null, sentAt: expect.any(String) });
  });
});

describe('two processes', () => {
  it('share sessions and what was saved', async () => {
    const [, second = ''] = server.urls;
    const there = await signInAs(second, 'surgeon');
    const id = await caseAt(4);
    const saved = await surgeon.send(
      'PUT',
      `/api/cases/${id}`,
      { record: { version: 1, who: { theatre: 'Here' } }, sheet: emptySheet, answers: [] },
      1,
    );
    expect(saved.status).toBe(200);
    expect(await (await there.get(`/api/cases/${id}`)).json()).toMatchObject({
      revision: 2,
      record: { who: { theatre: 'Here' } },
    });
  });
});

describe('a caution that the unit has settled', () => {
  it('is switched off with a reason and nothing else can be', async () => {
    const administrator = await signInAs(server.url, 'administrator');
    const settle = (rule: string, reason: string) =>
      administrator.post('/unit/checks', { rule, setting: 'off', reason });
    expect((await settle('side-differs', 'we know')).status).toBe(422);
    expect((await settle('expansile-concentration', '')).status).toBe(422);
    const id = await caseAt(1);
    const record = { version: 1, tamponade: { agent: 'SF6', concentrationPercent: 24 } };
    const save = async (revision: number) => {
      const saved = await surgeon.send(
        'PUT',
        `/api/cases/${id}`,
        { record, sheet: emptySheet, answers: [] },
        revision,
      );
      const { flags } = await saved.json();
      return flags.map(({ rule }: { rule: string }) => rule);
    };
    expect(await save(1)).toContain('expansile-concentration');
    expect((await settle('expansile-concentration', 'our protocol uses 24%')).status).toBe(303);
    expect(await save(2)).not.toContain('expansile-concentration');
    await expect(app.query('delete from check_settings')).rejects.toMatchObject({ code: '42501' });
  });
});

it('prints no patient data in its log', () => {
  const patient = fixture().who?.patient;
  for (const secret of ['Oakhollow', 'Quillfeather', patient?.familyName ?? 'x', patient?.number ?? 'x']) {
    expect(server.output()).not.toContain(secret);
  }
});
