import { writeFileSync } from 'node:fs';
import { draftNote } from '../../src/domain/drafting/draft.ts';
import { mergeSheet } from '../../src/domain/drafting/merge.ts';
import { draftLetter, isLetterKind, letterKinds } from '../../src/domain/letters/letters.ts';
import { draftDocx } from '../../src/server/documents/note-docx.ts';
import { BadInput, print, recordOf, takeOption } from './input.ts';

const unit = {
  name: 'Operative note',
  service: '',
  address: '',
  telephone: '',
  email: '',
  demonstration: false,
};

/** The instant in a document made here: fixed, so that the same record gives the same bytes. */
const AT = '2000-01-01T00:00:00Z';

/** draft FILE [--letter KIND] [--docx OUT] */
export const draft = async (args: string[]): Promise<number> => {
  const kind = takeOption(args, '--letter');
  const out = takeOption(args, '--docx');
  if (kind !== undefined && !isLetterKind(kind)) {
    throw new BadInput(`--letter takes ${Object.keys(letterKinds).join(', ')}`);
  }
  const record = recordOf(args[0]);
  const drafted = kind === undefined ? draftNote(record) : draftLetter(kind, record);
  if (out !== undefined) {
    const docx = await draftDocx(record, mergeSheet(null, drafted), unit, 1, AT);
    try {
      writeFileSync(out, docx);
    } catch {
      throw new BadInput(`cannot write ${out}`);
    }
  }
  print(drafted);
  return 0;
};
