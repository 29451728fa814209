import { desc, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditLog, people, recipients, sessions, units } from '../../src/db/schema.ts';
import { lucia } from '../../src/server/accounts/sessions.ts';
import { signIn } from '../../src/server/accounts/sign-in.ts';
import type { Visit } from '../../src/server/accounts/visit.ts';
import { database } from '../../src/server/database.ts';
import { answerDirectoryForm } from '../../src/server/practice/directory-form.ts';
import { answerPeopleForm } from '../../src/server/practice/people-form.ts';
import { saveUnit } from '../../src/server/practice/unit.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { endWork, visitAs, workOn } from '../support/desk.ts';

let on: TestDatabase;
let administrator: Visit;
let secretary: Visit;

beforeAll(async () => {
  on = await createTestDatabase({ demonstration: true });
  workOn(on);
  administrator = await visitAs('administrator');
  secretary = await visitAs('secretary');
});

afterAll(async () => {
  await endWork();
  await on.drop();
});

const formOf = (fields: Readonly<Record<string, string>>, roles: readonly string[] = []): FormData => {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.append(name, value);
  for (const role of roles) form.append('roles', role);
  return form;
};
const lastEntry = async () => {
  const [entry] = await database().select().from(auditLog).orderBy(desc(auditLog.position)).limit(1);
  return entry;
};

describe('the directory', () => {
  const fields = {
    name: 'Dr Linnet Ashgrove',
    kind: 'family-doctor',
    practice: 'Ashgrove Surgery',
    address: '3 Orchard Row\r\nLarkfield',
    email: ' linnet@example.org ',
  };
  const entry = async () => {
    const [row] = await database().select().from(recipients).where(eq(recipients.practice, fields.practice));
    if (row === undefined) throw new Error('There is no such entry');
    return row;
  };
  const ask = (form: string, change: Readonly<Record<string, string>> = {}) =>
    entry().then(({ id, revision }) =>
      answerDirectoryForm(secretary, formOf({ form, id, revision: String(revision), ...change })),
    );
  const change = (to: Readonly<Record<string, string>>) => ask('save', { ...fields, ...to });

  it('takes somebody in unconfirmed, with the lines of the address', async () => {
    expect(await answerDirectoryForm(secretary, formOf({ form: 'save', ...fields }))).toEqual({
      kind: 'done',
      said: 'added',
    });
    expect(await entry()).toMatchObject({
      address: '3 Orchard Row\nLarkfield',
      email: 'linnet@example.org',
      confirmedAt: null,
    });
    expect(await lastEntry()).toMatchObject({
      action: 'recipient:added',
      personId: secretary.person.id,
      detail: {},
    });
  });

  it('says beside each field what is wrong, and keeps what was typed', async () => {
    const answer = await answerDirectoryForm(
      secretary,
      formOf({ form: 'save', name: 'Dr Finch', email: 'finch' }),
    );
    expect(answer).toMatchObject({ kind: 'refused', form: { typed: { name: 'Dr Finch', email: 'finch' } } });
    const wrong = answer.kind === 'refused' ? Object.keys(answer.form.errors).sort() : [];
    expect(wrong).toEqual(['address', 'email', 'kind', 'practice']);
  });

  it('keeps who confirmed an address and when, until anything of it changes', async () => {
    expect(await ask('confirm')).toMatchObject({ said: 'confirmed' });
    expect(await entry()).toMatchObject({ confirmedBy: secretary.person.id, confirmedAt: expect.any(Date) });
    expect(await change({ kind: 'hospital' })).toMatchObject({ said: 'changed' });
    expect((await entry()).confirmedAt).not.toBeNull();
    for (const to of [
      { email: 'new@example.org' },
      { address: '4 Orchard Row' },
      { name: 'Dr L. Ashgrove' },
    ]) {
      expect(await change(to)).toMatchObject({ said: 'changed' });
      expect(await entry()).toMatchObject({ confirmedAt: null, confirmedBy: null });
      await ask('confirm');
    }
  });

  it('confirms only what was looked at', async () => {
    const { revision } = await entry();
    await change({ address: '5 Orchard Row' });
    for (const seen of [String(revision), 'nothing']) {
      expect(await ask('confirm', { revision: seen })).toMatchObject({ kind: 'stale' });
      expect(await ask('save', { ...fields, revision: seen })).toMatchObject({ kind: 'refused' });
    }
    expect(await ask('confirm', { id: 'nobody' })).toMatchObject({ kind: 'stale' });
    expect(await entry()).toMatchObject({ address: '5 Orchard Row', confirmedAt: null });
  });

  it('ends writing to somebody, and resumes', async () => {
    expect(await ask('end')).toMatchObject({ said: 'ended' });
    expect((await entry()).active).toBe(false);
    expect(await ask('resume')).toMatchObject({ said: 'resumed' });
    expect((await entry()).active).toBe(true);
  });
});

describe('people', () => {
  const fields = {
    form: 'add',
    name: 'G. Coder',
    title: 'Clinical coder',
    email: 'Second.Coder@example.org',
    password: 'twelve letters and more',
  };
  const find = async () => {
    const [row] = await database().select().from(people).where(eq(people.name, fields.name));
    if (row === undefined) throw new Error('There is no such person');
    return row;
  };
  const enters = (password: string) => signIn('second.coder@example.org', password, '192.0.2.1');
  const openSessions = async () =>
    (
      await database()
        .select()
        .from(sessions)
        .where(eq(sessions.userId, (await find()).id))
    ).length;

  it('are added with a hashed password and can sign in', async () => {
    expect(await answerPeopleForm(administrator, formOf(fields, ['coder', 'auditor']))).toEqual({
      kind: 'done',
      said: 'added',
    });
    const row = await find();
    expect(row).toMatchObject({
      email: 'second.coder@example.org',
      roles: ['coder', 'auditor'],
      active: true,
    });
    expect(row.passwordHash).toMatch(/^\$argon2id\$/);
    expect(await enters(fields.password)).toMatchObject({ ok: true });
  });

  it('are refused with a short password, an address that is taken or no role; the password is not given back', async () => {
    const short = await answerPeopleForm(
      administrator,
      formOf({ ...fields, password: 'short' }, ['coder', 'auditor']),
    );
    expect(short).toMatchObject({
      kind: 'refused-new',
      form: { errors: { password: 'Use at least 12 characters' }, typed: { roles: 'coder auditor' } },
    });
    expect(JSON.stringify(short)).not.toContain('"short"');
    const taken = await answerPeopleForm(administrator, formOf(fields, ['coder']));
    expect(taken).toMatchObject({ form: { errors: { email: 'Somebody has this e-mail address already' } } });
    const idle = await answerPeopleForm(administrator, formOf({ ...fields, email: 'third@example.org' }));
    expect(idle).toMatchObject({ form: { errors: { roles: 'Choose at least one role' } } });
  });

  it('get a new password, which ends their sessions', async () => {
    const { id } = await find();
    const password = 'another twelve letters';
    expect(await openSessions()).toBe(1);
    const bad = await answerPeopleForm(administrator, formOf({ form: 'password', id, password: 'short' }));
    expect(bad).toMatchObject({ kind: 'refused', asked: 'password' });
    expect(await openSessions()).toBe(1);
    await answerPeopleForm(administrator, formOf({ form: 'password', id, password }));
    expect(await openSessions()).toBe(0);
    expect(await enters(fields.password)).toMatchObject({ ok: false });
    expect(await enters(password)).toMatchObject({ ok: true });
    expect(JSON.stringify(await database().select().from(auditLog))).not.toContain(password);
  });

  it('are kept out at once and let in again; nobody keeps themselves out', async () => {
    const { id } = await find();
    const set = (who: string, active: string) =>
      answerPeopleForm(administrator, formOf({ form: 'active', id: who, active }));
    const entered = await enters('another twelve letters');
    const token = entered.ok ? entered.value.token : '';
    expect((await lucia().validateSession(token)).session).not.toBeNull();
    expect(await set(id, 'no')).toMatchObject({ said: 'kept-out' });
    expect((await lucia().validateSession(token)).session).toBeNull();
    expect(await enters('another twelve letters')).toMatchObject({ ok: false });
    expect(await set(id, 'yes')).toMatchObject({ said: 'let-in' });
    expect(await set(administrator.person.id, 'no')).toMatchObject({ kind: 'refused' });
    expect(await set('nobody', 'no')).toMatchObject({ kind: 'refused' });
    const [self] = await database().select().from(people).where(eq(people.id, administrator.person.id));
    expect(self?.active).toBe(true);
  });
});

describe('the unit', () => {
  const fields = {
    name: 'Larkfield Eye Unit',
    service: 'Retinal service',
    address: '2 Meadow Lane, Larkfield',
    telephone: '01632 960001',
    email: 'unit@example.org',
  };

  it('is changed with a new version and an entry in the log, or not at all', async () => {
    const version = async () => {
      const [row] = await database().select().from(units).where(eq(units.id, administrator.unit.id));
      return row?.version;
    };
    const refused = await saveUnit(administrator, formOf({ ...fields, email: 'nowhere' }));
    expect(refused).toMatchObject({ ok: false, error: { typed: { address: fields.address } } });
    expect(await version()).toBe(1);
    expect(await saveUnit(administrator, formOf(fields))).toMatchObject({ ok: true });
    expect(await version()).toBe(2);
    expect(await lastEntry()).toMatchObject({ action: 'unit:changed', detail: { version: 2 } });
  });
});
