import { and, asc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Database } from '../../db/client.ts';
import { people, sessions } from '../../db/schema.ts';
import { roles } from '../../domain/access/policy.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import { forgetAttempts } from '../accounts/attempts.ts';
import { hashPassword } from '../accounts/passwords.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { type FormErrors, isId, readForm, typedIn } from './read-form.ts';

const password = z.string().min(12, 'Use at least 12 characters').max(200, 'Use at most 200 characters');

const form = z.object({
  name: z.string().trim().min(2, 'Write the name as it is printed under a signature').max(200),
  title: z.string().trim().min(2, 'Write the title, like Consultant vitreoretinal surgeon').max(200),
  email: z
    .string()
    .trim()
    .toLowerCase()
    .max(200)
    .pipe(z.email('Write an e-mail address, like name@example.org')),
  roles: z.array(z.enum(roles)).min(1, 'Choose at least one role'),
  password,
});

type PersonRow = typeof people.$inferSelect;

export const peopleOf = (db: Database, unitId: string): Promise<PersonRow[]> =>
  db.select().from(people).where(eq(people.unitId, unitId)).orderBy(asc(people.name), asc(people.id));

export const addPerson = async (visit: Visit, sent: FormData): Promise<Result<null, FormErrors>> => {
  const read = readForm(form, sent, ['roles']);
  if (!read.ok) return read;
  const { password: chosen, ...person } = read.value;
  const passwordHash = await hashPassword(chosen);
  return database().transaction(async (tx): Promise<Result<null, FormErrors>> => {
    const [row] = await tx
      .insert(people)
      .values({ ...person, unitId: visit.unit.id, passwordHash })
      .onConflictDoNothing()
      .returning({ id: people.id });
    if (row === undefined) {
      return {
        ok: false,
        error: { errors: { email: 'Somebody has this e-mail address already' }, typed: typedIn(sent) },
      };
    }
    await appendAudit(tx, actorOf(visit), 'person:added', row.id, { roles: person.roles.join(' ') });
    return ok(null);
  });
};

const mine = (visit: Visit, id: string) => and(eq(people.id, id), eq(people.unitId, visit.unit.id));

const nobody = () => fail('not-found', 'There is no such person in this unit.');

/** Lets somebody in or keeps them out; whoever is kept out is signed out at once. Nobody can keep themselves out. */
export const setActive = async (visit: Visit, id: string, active: boolean): Promise<Result<null>> => {
  if (id === visit.person.id)
    return fail('oneself', 'You cannot keep yourself out. Ask another administrator to do it.');
  if (!isId(id)) return nobody();
  return database().transaction(async (tx): Promise<Result<null>> => {
    const [row] = await tx.update(people).set({ active }).where(mine(visit, id)).returning({ id: people.id });
    if (row === undefined) return nobody();
    if (!active) await tx.delete(sessions).where(eq(sessions.userId, id));
    await appendAudit(tx, actorOf(visit), active ? 'person:activated' : 'person:deactivated', id);
    return ok(null);
  });
};

/** Gives somebody a new password, ends their sessions and lets them try at once, all or nothing. */
export const setPassword = async (visit: Visit, id: string, chosen: string): Promise<Result<null>> => {
  const read = password.safeParse(chosen);
  if (!read.success) return fail('invalid', read.error.issues[0]?.message ?? '');
  if (!isId(id)) return nobody();
  const passwordHash = await hashPassword(read.data);
  const changed = await database().transaction(async (tx) => {
    const [row] = await tx
      .update(people)
      .set({ passwordHash })
      .where(mine(visit, id))
      .returning({ id: people.id, email: people.email });
    if (row === undefined) return undefined;
    await tx.delete(sessions).where(eq(sessions.userId, id));
    await appendAudit(tx, actorOf(visit), 'person:password-set', id);
    return row;
  });
  if (changed === undefined) return nobody();
  await forgetAttempts(changed);
  return ok(null);
};
