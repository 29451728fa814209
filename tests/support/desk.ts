import { readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { asc, eq } from 'drizzle-orm';
import { cases, letters, people, units } from '../../src/db/schema.ts';
import type { Role } from '../../src/domain/access/policy.ts';
import type { CaseRecord } from '../../src/domain/record/schema.ts';
import type { Visit } from '../../src/server/accounts/visit.ts';
import { saveCase } from '../../src/server/cases/save.ts';
import { connections, database } from '../../src/server/database.ts';
import { demonstrationPeople } from '../../src/server/demonstration-people.ts';
import { signCase } from '../../src/server/signing/sign.ts';
import type { TestDatabase } from './database.ts';

/** Lets the use cases run in this process, on a database of the test's own. Call before the first of them. */
export const workOn = (on: TestDatabase, smtpUrl = 'smtp://127.0.0.1:9'): void => {
  Object.assign(process.env, {
    DATABASE_URL: on.url,
    SMTP_URL: smtpUrl,
    MAIL_FROM: 'unit@example.org',
    PUBLIC_ADDRESS: 'http://127.0.0.1:4321',
    SIGNING_KEY_FOLDER: tmpdir(),
    DEMONSTRATION: 'true',
    LOG_LEVEL: 'silent',
  });
};

export const endWork = (): Promise<void> => connections().end();

/** Somebody of the demonstration unit, as the use cases are told. */
export const visitAs = async (role: Role): Promise<Visit> => {
  const email = demonstrationPeople.find((person) => person.role === role)?.email ?? '';
  const [row] = await database()
    .select({ person: people, unit: units })
    .from(people)
    .innerJoin(units, eq(people.unitId, units.id))
    .where(eq(people.email, email));
  if (row === undefined) throw new Error(`There is no ${role}`);
  const { id, name, title, roles } = row.person;
  return { sessionId: 'none', person: { id, email, name, title, roles }, unit: row.unit };
};

export const fixtureOf = (name: string): CaseRecord =>
  JSON.parse(readFileSync(new URL(`../fixtures/${name}.json`, import.meta.url), 'utf8'));

/** Signs the case at a place of today's list with a complete record; gives the ids of its letters by kind. */
export const signAt = async (position: number, record: CaseRecord): Promise<Record<string, string>> => {
  const surgeon = await visitAs('surgeon');
  const [listed] = await database().select({ id: cases.id }).from(cases).where(eq(cases.position, position));
  if (listed === undefined) throw new Error(`There is no case at ${position}`);
  const sheet = { title: 'Operative note', sections: [] };
  const saved = await saveCase(surgeon, listed.id, 1, { record, sheet, answers: [] });
  if (!saved.ok) throw new Error(saved.error.message);
  const password = demonstrationPeople.find(({ email }) => email === surgeon.person.email)?.password ?? '';
  const signed = await signCase(surgeon, listed.id, 2, { password, meaning: 'author' });
  if (!signed.ok) throw new Error(`${signed.error.message} ${JSON.stringify(signed.error.flags ?? [])}`);
  const rows = await database()
    .select({ id: letters.id, kind: letters.kind })
    .from(letters)
    .where(eq(letters.signedVersionId, signed.value.signedVersionId))
    .orderBy(asc(letters.kind));
  return Object.fromEntries(rows.map(({ id, kind }) => [kind, id]));
};
