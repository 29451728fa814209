import { and, asc, count, desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases, letters, recipients, signedVersions } from '../../db/schema.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';

export const letterStates = ['waiting', 'failed', 'queued', 'sent'] as const;
export type LetterState = (typeof letterStates)[number];

export interface LetterLine {
  id: string;
  kind: string;
  patient: string;
  eye: string;
  signedAt: Date;
  recipient: string | null;
  lastError: string | null;
  sentAt: Date | null;
}

export const LETTERS_PER_PAGE = 50;

export const nameOf = (record: CaseRecord): string =>
  [record.who?.patient?.familyName, record.who?.patient?.givenName]
    .filter((part) => part !== undefined)
    .join(', ');

/** How many letters are in each state. */
export const letterCounts = async (db: Database, unitId: string): Promise<Record<LetterState, number>> => {
  const rows = await db
    .select({ state: letters.state, letters: count() })
    .from(letters)
    .innerJoin(signedVersions, eq(letters.signedVersionId, signedVersions.id))
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .where(eq(cases.unitId, unitId))
    .groupBy(letters.state);
  const counts = { waiting: 0, failed: 0, queued: 0, sent: 0 };
  for (const row of rows) counts[row.state] = row.letters;
  return counts;
};

/** Letters in one state: what waits the oldest first, what was sent the newest first. */
export const lettersIn = async (db: Database, unitId: string, state: LetterState): Promise<LetterLine[]> => {
  const rows = await db
    .select({
      letter: letters,
      record: cases.record,
      signedAt: signedVersions.signedAt,
      recipient: recipients.name,
    })
    .from(letters)
    .innerJoin(signedVersions, eq(letters.signedVersionId, signedVersions.id))
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .leftJoin(recipients, eq(letters.recipientId, recipients.id))
    .where(and(eq(cases.unitId, unitId), eq(letters.state, state)))
    .orderBy(state === 'sent' ? desc(letters.sentAt) : asc(letters.createdAt), asc(letters.id))
    .limit(LETTERS_PER_PAGE);
  return rows.map(({ letter, record, signedAt, recipient }) => ({
    id: letter.id,
    kind: letter.kind,
    patient: nameOf(record),
    eye: record.who?.eye ?? '',
    signedAt,
    recipient,
    lastError: letter.lastError,
    sentAt: letter.sentAt,
  }));
};
