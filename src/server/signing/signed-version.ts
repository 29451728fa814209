import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases, signedVersions } from '../../db/schema.ts';
import type { CaseSigned } from '../../domain/api.ts';
import type { FrozenNote } from '../../domain/signing/frozen.ts';

type Row = typeof signedVersions.$inferSelect;

export interface SignedNote {
  row: Row;
  note: FrozenNote;
}

export const signedOf = ({ id, version, sha256: hash, verificationCode, signedAt }: Row): CaseSigned => ({
  signedVersionId: id,
  version,
  sha256: hash,
  verificationCode,
  signedAt: signedAt.toISOString(),
});

/** What was signed, as it was signed. */
export const readSigned = async (
  db: Database,
  unitId: string,
  by: { id: string } | { caseId: string },
): Promise<SignedNote | undefined> => {
  const wanted = 'id' in by ? eq(signedVersions.id, by.id) : eq(signedVersions.caseId, by.caseId);
  const [found] = await db
    .select({ row: signedVersions })
    .from(signedVersions)
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .where(and(wanted, eq(cases.unitId, unitId)))
    .orderBy(desc(signedVersions.version))
    .limit(1);
  if (found === undefined) return undefined;
  const note: FrozenNote = JSON.parse(found.row.canonical);
  return { row: found.row, note };
};
