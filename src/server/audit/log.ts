import { asc, desc, gt, sql } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { auditLog } from '../../db/schema.ts';
import { type End, type Entry, follow, START, textOf } from '../../domain/signing/chain.ts';
import { sha256 } from '../signing/sha256.ts';

/** On whose behalf something is done; `personId` is null for work in the background. */
export interface Actor {
  personId: string | null;
  unitId: string;
}

/** Any number will do, as long as everybody who appends asks for the same one. */
const APPEND_LOCK = 4_871_136;

const endOf = async (db: Database): Promise<End> => {
  const [last] = await db
    .select({ position: auditLog.position, hash: auditLog.hash })
    .from(auditLog)
    .orderBy(desc(auditLog.position))
    .limit(1);
  return last ?? START;
};

/**
 * Appends to the audit log inside the caller's transaction, so that what was done and its entry stand or fall together.
 * Whoever appends next waits for the end of that transaction: append last. `detail` never holds patient data.
 */
export const appendAudit = async (
  tx: Database,
  actor: Actor,
  action: string,
  subject: string,
  detail: Entry['detail'] = {},
): Promise<void> => {
  await tx.execute(sql`select pg_advisory_xact_lock(${APPEND_LOCK})`);
  const end = await endOf(tx);
  const at = new Date();
  const entry: Entry = {
    position: end.position + 1,
    at: at.toISOString(),
    personId: actor.personId,
    action,
    subject,
    detail,
    previousHash: end.hash,
  };
  await tx.insert(auditLog).values({ ...entry, at, detail: { ...detail }, hash: sha256(textOf(entry)) });
};

const PAGE = 1000;

/** Walks the whole chain: the first position whose hash or link does not hold, or `null`. */
export const firstBrokenPosition = async (db: Database): Promise<number | null> => {
  let end = START;
  for (;;) {
    const rows = await db
      .select()
      .from(auditLog)
      .where(gt(auditLog.position, end.position))
      .orderBy(asc(auditLog.position))
      .limit(PAGE);
    const links = rows.map(({ hash, at, ...row }) => ({ hash, entry: { ...row, at: at.toISOString() } }));
    const followed = follow(end, links, sha256);
    if (!followed.holds) return followed.position;
    if (rows.length < PAGE) return null;
    end = followed.end;
  }
};
