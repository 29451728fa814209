import { eq } from 'drizzle-orm';
import { people } from '../../db/schema.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { confirmed, mayTryConfirming, mayTrySigningIn, signedInFrom, tooMany } from './attempts.ts';
import { passwordFits } from './passwords.ts';
import { lucia } from './sessions.ts';

/** Opens a session. The answer and its time are the same for an unknown person and a wrong password. */
export const signIn = async (
  typedEmail: string,
  password: string,
  place: string,
): Promise<Result<{ token: string; roles: (typeof people.$inferSelect)['roles'] }>> => {
  // The database holds no character zero; nobody's address has one either.
  const email = typedEmail.replaceAll('\u0000', '').trim().toLowerCase();
  if (!(await mayTrySigningIn(email, place))) return tooMany();
  const db = database();
  const [person] = await db.select().from(people).where(eq(people.email, email));
  const fits = await passwordFits(person?.active === true ? person.passwordHash : undefined, password);
  if (!fits || person === undefined) {
    return fail('wrong-password', 'This e-mail address and password do not fit together.');
  }
  await signedInFrom(email, place);
  await lucia().deleteExpiredSessions();
  const session = await lucia().createSession(person.id, {});
  await db.transaction((tx) =>
    appendAudit(tx, { personId: person.id, unitId: person.unitId }, 'person:signed-in', person.id),
  );
  return ok({ token: session.id, roles: person.roles });
};

/** Asks for the password of somebody who is signed in already, for what must not be done on an open screen. */
export const confirmPassword = async (person: { id: string }, password: string): Promise<Result<null>> => {
  if (!(await mayTryConfirming(person.id))) return tooMany();
  const [row] = await database()
    .select({ passwordHash: people.passwordHash })
    .from(people)
    .where(eq(people.id, person.id));
  if (!(await passwordFits(row?.passwordHash, password))) {
    return fail('wrong-password', 'This is not your password.');
  }
  await confirmed(person.id);
  return ok(null);
};
