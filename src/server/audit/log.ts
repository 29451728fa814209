import { createHash } from 'node:crypto';
import { asc, desc, gt, sql } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { auditLog } from '../../db/schema.ts';
import { canonical } from '../../domain/signing/canonical.ts';

/** On whose behalf something is done; `personId` is null for work in the background. */
export interface Actor {
  personId: string | null;
  unitId: string;
}

type Detail = Readonly<Record<string, string | number | boolean>>;

/** Any number will do, as long as everybody who appends asks for the same one. */
const APPEND_LOCK = 4_871_136;
const GENESIS = '0'.repeat(64);

interface Entry {
  position: number;
  at: string;
  personId: string | null;
  action: string;
  subject: string;
  detail: Detail;
  previousHash: string;
}

const hashOf = (entry: Entry): string => createHash('sha256').update(canonical(entry)).digest('hex');

/**
 * Appends to the audit log inside the caller's transaction, so that what was done and its entry stand or fall together.
 * `detail` never holds patient data.
 */
export const appendAudit = async (
  tx: Database,
  actor: Actor,
  action: string,
  subject: string,
  detail: Detail = {},
): Promise<void> => {
  await tx.execute(sql`select pg_advisory_xact_lock(${APPEND_LOCK})`);
  const [last] = await tx
    .select({ position: auditLog.position, hash: auditLog.hash })
    .from(auditLog)
    .orderBy(desc(auditLog.position))
    .limit(1);
  const at = new Date();
  const entry: Entry = {
    position: (last?.position ?? 0) + 1,
    at: at.toISOString(),
    personId: actor.personId,
    action,
    subject,
    detail,
    previousHash: last?.hash ?? GENESIS,
  };
  await tx.insert(auditLog).values({ ...entry, at, detail: { ...detail }, hash: hashOf(entry) });
};

const PAGE = 1000;

/** Walks the whole chain: the first position whose hash or link does not hold, or `null`. */
export const firstBrokenPosition = async (db: Database): Promise<number | null> => {
  let previousHash = GENESIS;
  let position = 0;
  for (;;) {
    const rows = await db
      .select()
      .from(auditLog)
      .where(gt(auditLog.position, position))
      .orderBy(asc(auditLog.position))
      .limit(PAGE);
    for (const { hash, at, ...row } of rows) {
      position += 1;
      const entry: Entry = { ...row, at: at.toISOString() };
      if (row.position !== position || row.previousHash !== previousHash || hash !== hashOf(entry))
        return position;
      previousHash = hash;
    }
    if (rows.length < PAGE) return null;
  }
};
