import { and, asc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Database } from '../../db/client.ts';
import { people, recipients } from '../../db/schema.ts';
import { type Failure, fail, ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { type FormErrors, isId, readForm, typedIn } from './read-form.ts';

export const recipientKinds = {
  optometrist: 'optometrist',
  ophthalmologist: 'ophthalmologist',
  'family-doctor': 'family doctor',
  hospital: 'hospital',
} as const;

const form = z.object({
  name: z.string().trim().min(2, 'Write the name').max(200, 'Write at most 200 characters'),
  kind: z.enum(['optometrist', 'ophthalmologist', 'family-doctor', 'hospital'], 'Choose what they are'),
  practice: z.string().trim().min(2, 'Write the practice').max(200, 'Write at most 200 characters'),
  address: z
    .string()
    .trim()
    .min(5, 'Write the whole address')
    .max(500, 'Write at most 500 characters')
    .transform((text) => text.replace(/\r\n?/g, '\n')),
  email: z.string().trim().max(200).pipe(z.email('Write an e-mail address, like name@example.org')),
});

export interface DirectoryLine {
  recipient: typeof recipients.$inferSelect;
  confirmedBy: string | null;
}

/** The directory by name, with who confirmed each address; those who are no longer written to come last. */
export const directory = async (db: Database, unitId: string): Promise<DirectoryLine[]> => {
  const rows = await db
    .select({ recipient: recipients, confirmedBy: people.name })
    .from(recipients)
    .leftJoin(people, eq(recipients.confirmedBy, people.id))
    .where(eq(recipients.unitId, unitId))
    .orderBy(asc(recipients.name), asc(recipients.id));
  return [...rows.filter((row) => row.recipient.active), ...rows.filter((row) => !row.recipient.active)];
};

const stale = 'Somebody changed this entry meanwhile. Look at it again before going on.';

/** Adds somebody to the directory; nobody is written to before the address is confirmed. */
export const addRecipient = async (visit: Visit, sent: FormData): Promise<Result<null, FormErrors>> => {
  const read = readForm(form, sent);
  if (!read.ok) return read;
  await database().transaction(async (tx) => {
    const [row] = await tx
      .insert(recipients)
      .values({ unitId: visit.unit.id, ...read.value })
      .returning({ id: recipients.id });
    if (row !== undefined) await appendAudit(tx, actorOf(visit), 'recipient:added', row.id);
  });
  return ok(null);
};

/** Changes an entry upon the revision that was looked at; whatever is printed or used as address has to be confirmed again. */
export const changeRecipient = async (
  visit: Visit,
  id: string,
  revision: number,
  sent: FormData,
): Promise<Result<null, FormErrors>> => {
  const read = readForm(form, sent);
  if (!read.ok) return read;
  return database().transaction(async (tx): Promise<Result<null, FormErrors>> => {
    const refused = { ok: false as const, error: { errors: { name: stale }, typed: typedIn(sent) } };
    if (!isId(id)) return refused;
    const mine = and(eq(recipients.id, id), eq(recipients.unitId, visit.unit.id));
    const [before] = await tx.select().from(recipients).where(mine).for('update');
    if (before === undefined || before.revision !== revision) return refused;
    const isSame = (['email', 'address', 'practice', 'name'] as const).every(
      (field) => before[field] === read.value[field],
    );
    await tx
      .update(recipients)
      .set({
        ...read.value,
        revision: revision + 1,
        ...(isSame ? {} : { confirmedBy: null, confirmedAt: null }),
      })
      .where(mine);
    await appendAudit(tx, actorOf(visit), 'recipient:changed', id, { confirmedStill: isSame });
    return ok(null);
  });
};

const touch = (
  visit: Visit,
  id: string,
  revision: number,
  change: Partial<typeof recipients.$inferInsert>,
  action: string,
): Promise<Result<null, Failure>> =>
  database().transaction(async (tx) => {
    if (!isId(id) || !Number.isSafeInteger(revision)) return fail('stale', stale);
    const [row] = await tx
      .update(recipients)
      .set(change)
      // What was looked at is what is meant: an entry that has changed since stays as it is.
      .where(
        and(eq(recipients.id, id), eq(recipients.unitId, visit.unit.id), eq(recipients.revision, revision)),
      )
      .returning({ id: recipients.id });
    if (row === undefined) return fail('stale', stale);
    await appendAudit(tx, actorOf(visit), action, id);
    return ok(null);
  });

/** Keeps who has looked at the whole address, and when. */
export const confirmRecipient = (
  visit: Visit,
  id: string,
  revision: number,
): Promise<Result<null, Failure>> =>
  touch(
    visit,
    id,
    revision,
    { confirmedBy: visit.person.id, confirmedAt: new Date() },
    'recipient:confirmed',
  );

/** Ends or resumes writing to somebody; letters that have gone stay as they are. */
export const setWrittenTo = (
  visit: Visit,
  id: string,
  revision: number,
  active: boolean,
): Promise<Result<null, Failure>> =>
  touch(visit, id, revision, { active }, active ? 'recipient:resumed' : 'recipient:ended');
