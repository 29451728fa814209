import { and, desc, eq, lt, or, sql } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases, codings, people, signedVersions } from '../../db/schema.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';

export interface SignedLine {
  id: string;
  signedAt: Date;
  signer: string;
  code: string;
  record: CaseRecord;
  codedAt: Date | null;
}

/** A place in the list, the newest first: what was signed before it comes next. */
export interface Cursor {
  signedAt: Date;
  id: string;
}

export const SIGNED_PER_PAGE = 50;

/** Signed notes of a unit, the newest first, a page at a time from a place. */
export const signedNotes = (
  db: Database,
  unitId: string,
  { before, uncoded = false }: { before?: Cursor; uncoded?: boolean } = {},
): Promise<SignedLine[]> =>
  db
    .select({
      id: signedVersions.id,
      signedAt: signedVersions.signedAt,
      signer: people.name,
      code: signedVersions.verificationCode,
      record: cases.record,
      codedAt: codings.markedAt,
    })
    .from(signedVersions)
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .innerJoin(people, eq(signedVersions.signerId, people.id))
    .leftJoin(codings, eq(codings.signedVersionId, signedVersions.id))
    .where(
      and(
        eq(cases.unitId, unitId),
        uncoded ? sql`${codings.markedAt} is null` : undefined,
        before === undefined
          ? undefined
          : or(
              lt(signedVersions.signedAt, before.signedAt),
              and(eq(signedVersions.signedAt, before.signedAt), lt(signedVersions.id, before.id)),
            ),
      ),
    )
    .orderBy(desc(signedVersions.signedAt), desc(signedVersions.id))
    .limit(SIGNED_PER_PAGE);

/** Reads a place from a page's address, `2026-12-01T10:42:00.000Z_ID`. */
export const cursorOf = (text: string | null): Cursor | undefined => {
  const [at = '', id = ''] = (text ?? '').split('_');
  const signedAt = new Date(at);
  return Number.isNaN(signedAt.getTime()) || !/^[0-9a-f-]{36}$/.test(id) ? undefined : { signedAt, id };
};

export const cursorText = ({ signedAt, id }: Cursor): string => `${signedAt.toISOString()}_${id}`;
