import { hash, verify } from '@node-rs/argon2';

const cost = { memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 } as const;

export const hashPassword = (password: string): Promise<string> => hash(password, cost);

// Any hash at the same cost: it is only there to take the same time.
const decoy = hashPassword('nobody has this password');

/** Whether the password fits. An unknown person (no hash) takes as long as a known one, and never fits. */
export const passwordFits = async (passwordHash: string | undefined, password: string): Promise<boolean> => {
  const fits = await verify(passwordHash ?? (await decoy), password);
  return passwordHash !== undefined && fits;
};
