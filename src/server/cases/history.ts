import { and, asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { caseRevisions, people } from '../../db/schema.ts';
import type { Sheet } from '../../domain/drafting/sheet.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';

export interface RevisionLine {
  revision: number;
  savedAt: Date;
  by: string | null;
}

/** Every revision of a case before signature, the oldest first. */
export const revisionsOf = (db: Database, caseId: string): Promise<RevisionLine[]> =>
  db
    .select({ revision: caseRevisions.revision, savedAt: caseRevisions.savedAt, by: people.name })
    .from(caseRevisions)
    .leftJoin(people, eq(caseRevisions.savedBy, people.id))
    .where(eq(caseRevisions.caseId, caseId))
    .orderBy(asc(caseRevisions.revision));

/** What a case said at a revision. */
export const revisionAt = async (
  db: Database,
  caseId: string,
  revision: number,
): Promise<{ record: CaseRecord; sheet: Sheet | null } | undefined> => {
  const [row] = await db
    .select({ record: caseRevisions.record, sheet: caseRevisions.sheet })
    .from(caseRevisions)
    .where(and(eq(caseRevisions.caseId, caseId), eq(caseRevisions.revision, revision)));
  return row;
};
