import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { codings, people } from '../../db/schema.ts';

export interface Marked {
  codes: string[];
  note: string;
  at: Date;
  by: string;
}

/** What a coder took of a note's codes, or nothing yet. */
export const codingOf = async (db: Database, signedVersionId: string): Promise<Marked | undefined> => {
  const [found] = await db
    .select({ coding: codings, by: people.name })
    .from(codings)
    .innerJoin(people, eq(codings.coderId, people.id))
    .where(eq(codings.signedVersionId, signedVersionId));
  if (found === undefined) return undefined;
  const { codes, note, markedAt } = found.coding;
  return { codes: codes.map(({ set, code }) => `${set} ${code}`), note, at: markedAt, by: found.by };
};
