import { and, asc, eq } from 'drizzle-orm';
import Papa from 'papaparse';
import type { Database } from '../../db/client.ts';
import { cases, codings, signedVersions } from '../../db/schema.ts';
import { notice } from '../../domain/coding/code-sets.ts';

/** A cell that a spreadsheet would take for a formula is kept as text. */
const cell = (text: string): string => (/^[=+\-@\t\r]/.test(text) ? `'${text}` : text);

/** What was coded, one code a line, as CSV. The record number is the only identity in it. */
export const codingCsv = async (db: Database, unitId: string): Promise<string> => {
  const rows = await db
    .select({ record: cases.record, coding: codings, code: signedVersions.verificationCode })
    .from(codings)
    .innerJoin(signedVersions, eq(codings.signedVersionId, signedVersions.id))
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .where(and(eq(cases.unitId, unitId)))
    .orderBy(asc(codings.markedAt), asc(codings.signedVersionId));
  const lines = rows.flatMap(({ record, coding, code }) =>
    coding.codes.map((one) => [
      record.who?.patient?.number ?? '',
      record.who?.startedAt?.slice(0, 10) ?? '',
      record.who?.eye ?? '',
      one.set,
      one.code,
      one.title,
      coding.markedAt.toISOString(),
      code,
      coding.note,
    ]),
  );
  const head = [
    'record number',
    'operated on',
    'eye',
    'code set',
    'code',
    'our description',
    'coded at',
    'note version',
    'note',
  ];
  return `${Papa.unparse([head, ...lines.map((line) => line.map(cell)), [notice]])}\r\n`;
};
