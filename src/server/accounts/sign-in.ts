import { eq } from 'drizzle-orm';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { people } from '../../db/schema.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import { appendAudit } from '../audit/log.ts';
import { connections, database } from '../database.ts';
import { passwordFits } from './passwords.ts';
import { lucia } from './sessions.ts';

const MINUTE = 60;

let limiters: { person: RateLimiterPostgres; place: RateLimiterPostgres } | undefined;

const limits = () => {
  limiters ??= (() => {
    const store = {
      storeClient: connections(),
      tableName: 'rate_limits',
      tableCreated: true,
      storeType: 'pool',
    };
    return {
      person: new RateLimiterPostgres({ ...store, keyPrefix: 'person', points: 8, duration: 15 * MINUTE }),
      place: new RateLimiterPostgres({ ...store, keyPrefix: 'place', points: 60, duration: 15 * MINUTE }),
    };
  })();
  return limiters;
};

const withinLimit = async (limiter: RateLimiterPostgres, key: string): Promise<boolean> => {
  try {
    await limiter.consume(key);
    return true;
  } catch (refused) {
    if (refused instanceof RateLimiterRes) return false;
    throw refused;
  }
};

const tooMany = () =>
  fail(
    'too-many-attempts',
    'Too many attempts. Wait a quarter of an hour, or ask an administrator for a new password.',
  );

/** Whether this person may try a password once more; the counters are shared by every process. */
export const mayTry = async (email: string, place: string): Promise<boolean> => {
  const { person, place: anywhere } = limits();
  return (await withinLimit(anywhere, place)) && (await withinLimit(person, email));
};

/** Forgets failed attempts after a password that fitted. */
export const forgetAttempts = async (email: string): Promise<void> => {
  await limits().person.delete(email);
};

/** Opens a session. The answer and its time are the same for an unknown person and a wrong password. */
export const signIn = async (
  typedEmail: string,
  password: string,
  place: string,
): Promise<Result<{ token: string; roles: (typeof people.$inferSelect)['roles'] }>> => {
  const email = typedEmail.trim().toLowerCase();
  if (!(await mayTry(email, place))) return tooMany();
  const db = database();
  const [person] = await db.select().from(people).where(eq(people.email, email));
  const fits = await passwordFits(person?.active === true ? person.passwordHash : undefined, password);
  if (!fits || person === undefined) {
    return fail('wrong-password', 'This e-mail address and password do not fit together.');
  }
  await forgetAttempts(email);
  const session = await lucia().createSession(person.id, {});
  await appendInTransaction(person);
  return ok({ token: session.id, roles: person.roles });
};

const appendInTransaction = (person: typeof people.$inferSelect) =>
  database().transaction((tx) =>
    appendAudit(tx, { personId: person.id, unitId: person.unitId }, 'person:signed-in', person.id),
  );

/** Asks for the password of somebody who is signed in already, for what must not be done on an open screen. */
export const confirmPassword = async (
  person: { id: string; email: string },
  password: string,
  place: string,
): Promise<Result<null>> => {
  if (!(await mayTry(person.email, place))) return tooMany();
  const [row] = await database()
    .select({ passwordHash: people.passwordHash })
    .from(people)
    .where(eq(people.id, person.id));
  if (!(await passwordFits(row?.passwordHash, password)))
    return fail('wrong-password', 'This is not your password.');
  await forgetAttempts(person.email);
  return ok(null);
};
