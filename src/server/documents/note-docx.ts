import { Document, Packer, Paragraph, TextRun } from 'docx';
import type { UnitView } from '../../domain/api.ts';
import type { Answer, Flag } from '../../domain/checks/flag.ts';
import { flagKey } from '../../domain/checks/flag.ts';
import type { Sheet } from '../../domain/drafting/sheet.ts';
import { breaksTable, implantsTable } from '../../domain/drafting/tables.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';
import type { FrozenNote } from '../../domain/signing/frozen.ts';
import { normalizeDocx } from './normalize.ts';
import {
  heading,
  letterhead,
  patientBlock,
  plain,
  section,
  sheetWords,
  styles,
  table,
  title,
} from './parts.ts';

interface Seal {
  sha256: string;
  code: string;
}

const signedWhen = (at: string, zone: string): string =>
  new Intl.DateTimeFormat('en-GB', {
    dateStyle: 'long',
    timeStyle: 'long',
    timeZone: zone,
  }).format(new Date(at));

/** Name, title, meaning, date and time with zone, and how to prove it. */
const signatureBlock = ({ signature, version }: FrozenNote, { sha256, code }: Seal): Paragraph[] => [
  heading('Signature'),
  new Paragraph({
    keepNext: true,
    keepLines: true,
    children: [
      new TextRun({ text: `Signed electronically by ${signature.name}`, bold: true }),
      new TextRun({ text: `, ${signature.title}`, break: 0 }),
      new TextRun({ text: signature.meaning, break: 1 }),
      new TextRun({ text: signedWhen(signature.at, signature.zone), break: 1 }),
      new TextRun({ text: `Version ${version} · verification code ${code}`, break: 1 }),
      new TextRun({ text: `SHA-256 ${sha256.slice(0, 32)} ${sha256.slice(32)}`, break: 1, size: 15 }),
    ],
  }),
];

const answered = (flags: readonly Flag[], answers: readonly Answer[]): Paragraph[] => {
  const given = flags.flatMap((flag) => {
    const answer = answers.find((one) => flag.answerable && one.flag === flagKey(flag));
    return answer === undefined ? [] : [plain(`${flag.message} Answered by ${answer.by}: ${answer.reason}`)];
  });
  return given.length === 0 ? [] : [heading('Answered before signature'), ...given];
};

const tablesOf = (record: CaseRecord) =>
  [breaksTable(record), implantsTable(record)].flatMap((one) => (one === undefined ? [] : table(one)));

const pack = async (document: Document, at: string) => normalizeDocx(await Packer.toBuffer(document), at);

/** The signed note as DOCX; the same note always gives the same bytes. */
export const noteDocx = (note: FrozenNote, seal: Seal): Promise<Uint8Array> => {
  const { record, sheet, unit, version } = note;
  const children = [
    letterhead(unit),
    title(sheet.title),
    patientBlock(record),
    ...sheetWords(sheet),
    ...tablesOf(record),
    ...answered(note.flags, note.answers),
    ...signatureBlock(note, seal),
  ];
  const running = { record, unit, version: `signed version ${version} · ${seal.code}` };
  return pack(
    new Document({
      title: 'Operative note',
      creator: unit.name,
      styles,
      sections: [section(children, running)],
    }),
    note.signature.at,
  );
};

/** A draft as DOCX: every page says that it is not signed. */
export const draftDocx = (
  record: CaseRecord,
  sheet: Sheet,
  unit: UnitView,
  revision: number,
  at: string,
): Promise<Uint8Array> => {
  const children = [
    letterhead(unit),
    title(sheet.title),
    patientBlock(record),
    ...sheetWords(sheet),
    ...tablesOf(record),
  ];
  const running = { record, unit, version: `draft, revision ${revision}`, warning: 'DRAFT – not signed' };
  return pack(
    new Document({
      title: 'Operative note (draft)',
      creator: unit.name,
      styles,
      sections: [section(children, running)],
    }),
    at,
  );
};
