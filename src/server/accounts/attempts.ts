import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { fail } from '../../domain/result.ts';
import { connections } from '../database.ts';

const QUARTER_HOUR = 15 * 60;

const open = () => {
  const store = {
    storeClient: connections(),
    tableName: 'rate_limits',
    tableCreated: true,
    storeType: 'pool',
    duration: QUARTER_HOUR,
  };
  return {
    account: new RateLimiterPostgres({ ...store, keyPrefix: 'account', points: 8 }),
    place: new RateLimiterPostgres({ ...store, keyPrefix: 'place', points: 60 }),
    // Apart from signing in, so that a stranger who tries an account from outside cannot keep its owner from signing.
    confirmation: new RateLimiterPostgres({ ...store, keyPrefix: 'confirmation', points: 8 }),
  };
};

let opened: ReturnType<typeof open> | undefined;

const limits = () => {
  opened ??= open();
  return opened;
};

const within = async (limiter: RateLimiterPostgres, key: string): Promise<boolean> => {
  try {
    await limiter.consume(key);
    return true;
  } catch (refused) {
    if (refused instanceof RateLimiterRes) return false;
    throw refused;
  }
};

export const tooMany = () =>
  fail(
    'too-many-attempts',
    'Too many attempts. Wait a quarter of an hour, or ask an administrator for a new password.',
  );

/** Counts an attempt to sign in, by account and by place, known or not; every process counts in the same table. */
export const mayTrySigningIn = async (email: string, place: string): Promise<boolean> =>
  (await within(limits().place, place)) && (await within(limits().account, email));

/** Gives back what a sign-in that fitted has used up: a whole unit may share one place. */
export const signedInFrom = async (email: string, place: string): Promise<void> => {
  await Promise.all([limits().account.delete(email), limits().place.reward(place)]);
};

/** Counts an attempt of somebody signed in to confirm that it is them. */
export const mayTryConfirming = (personId: string): Promise<boolean> =>
  within(limits().confirmation, personId);

export const confirmed = async (personId: string): Promise<void> => {
  await limits().confirmation.delete(personId);
};

/** Lets somebody try again at once, after a new password. */
export const forgetAttempts = async (person: { id: string; email: string }): Promise<void> => {
  await Promise.all([limits().account.delete(person.email), limits().confirmation.delete(person.id)]);
};
