import { and, asc, count, desc, eq, type SQL, sql } from 'drizzle-orm';
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

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** Where the page after a letter begins: its own place in the order, asked of the database, which knows it to the microsecond. */
const beyond = (state: LetterState, after: string | null): SQL | undefined => {
  if (after === null || !UUID.test(after)) return undefined;
  const key = state === 'sent' ? letters.sentAt : letters.createdAt;
  const sign = state === 'sent' ? sql`<` : sql`>`;
  return sql`(${key}, ${letters.id}) ${sign} (select ${sql.identifier(key.name)}, id from letters where id = ${after})`;
};

/**
 * Letters in one state, a page at a time: what waits the oldest first, what was sent the newest first.
 * @param after id of the last letter of the page before
 */
export const lettersIn = async (
  db: Database,
  unitId: string,
  state: LetterState,
  after: string | null = null,
): Promise<{ lines: LetterLine[]; next: string | null }> => {
  const order =
    state === 'sent' ? [desc(letters.sentAt), desc(letters.id)] : [asc(letters.createdAt), asc(letters.id)];
  const rows = await db
    .select({
      id: letters.id,
      kind: letters.kind,
      lastError: letters.lastError,
      sentAt: letters.sentAt,
      record: cases.record,
      signedAt: signedVersions.signedAt,
      recipient: recipients.name,
    })
    .from(letters)
    .innerJoin(signedVersions, eq(letters.signedVersionId, signedVersions.id))
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .leftJoin(recipients, eq(letters.recipientId, recipients.id))
    .where(and(eq(cases.unitId, unitId), eq(letters.state, state), beyond(state, after)))
    .orderBy(...order)
    .limit(LETTERS_PER_PAGE + 1);
  const lines = rows.slice(0, LETTERS_PER_PAGE).map(({ record, ...line }) => ({
    ...line,
    patient: nameOf(record),
    eye: record.who?.eye ?? '',
  }));
  return { lines, next: rows.length > LETTERS_PER_PAGE ? (lines.at(-1)?.id ?? null) : null };
};
