import { Document, Packer, Paragraph } from 'docx';
import type { Sheet } from '../../domain/drafting/sheet.ts';
import { dateWords } from '../../domain/drafting/words.ts';
import type { FrozenNote } from '../../domain/signing/frozen.ts';
import { normalizeDocx } from './normalize.ts';
import { letterhead, patientBlock, plain, section, sheetWords, styles } from './parts.ts';

export interface Letter {
  note: FrozenNote;
  code: string;
  sheet: Sheet;
  /** Name and address, one line each. */
  recipient: readonly string[];
  /** Day of the letter, YYYY-MM-DD. */
  on: string;
}

/** A letter as DOCX; the same letter always gives the same bytes. */
export const letterDocx = async ({ note, code, sheet, recipient, on }: Letter): Promise<Uint8Array> => {
  const { record, unit, signature } = note;
  const children = [
    letterhead(unit),
    new Paragraph({ text: dateWords(on), spacing: { before: 200, after: 200 } }),
    ...recipient.map((text) => new Paragraph({ text, spacing: { after: 0 } })),
    new Paragraph({ text: '' }),
    patientBlock(record),
    ...sheetWords(sheet, ['salutation']),
    new Paragraph({ text: 'Yours sincerely,', spacing: { before: 240, after: 120 }, keepNext: true }),
    new Paragraph({ text: signature.name, spacing: { after: 0 }, keepNext: true }),
    new Paragraph({ text: signature.title, spacing: { after: 120 }, keepNext: true }),
    plain(`From the operative note signed on ${dateWords(signature.at)}, verification code ${code}.`),
  ];
  const document = new Document({
    title: 'Letter',
    creator: unit.name,
    styles,
    sections: [
      section(children, { record, unit, version: `letter from note version ${note.version} · ${code}` }),
    ],
  });
  return normalizeDocx(await Packer.toBuffer(document), `${on}T00:00:00Z`);
};
