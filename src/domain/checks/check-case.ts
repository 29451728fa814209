import type { Sheet, Statement } from '../drafting/sheet.ts';
import { readProse } from '../prose/read.ts';
import type { CaseRecord } from '../record/schema.ts';
import { checkRecord, type Settings } from './engine.ts';
import { type Flag, levels } from './flag.ts';

/** Statements without which a note lacks what the published standards require; a reason may answer their absence. */
const required = new Set([
  'operation.operation',
  'operation.when',
  'team.surgeon',
  'diagnosis.preoperative',
  'diagnosis.postoperative',
  'anaesthesia.kind',
  'end.no-complication',
  'end.complication.1',
  'end.blood-loss',
  'end.no-specimen',
  'end.specimen.1',
]);

const isTyped = ({ origin }: Statement) => origin === 'own' || origin === 'edited' || origin === 'parted';

const deniedWords = (statement: Statement, record: CaseRecord): Flag[] =>
  readProse(statement.text, record).map(({ words, field, recorded }) => ({
    rule: 'words-against-record',
    level: 'contradiction',
    fields: [field],
    message: `“${words}” stands in the sheet; the record says ${recorded}.`,
    answerable: false,
    statement: statement.id,
  }));

const takenOut = ({ id, drafted, reads, origin }: Statement): Flag[] =>
  origin !== 'deleted' || drafted === '' || !required.has(id)
    ? []
    : [
        {
          rule: 'required-statement-taken-out',
          level: 'omission',
          fields: reads.slice(0, 3),
          message: `A statement that the standards require was taken out: “${drafted}”`,
          answerable: true,
        },
      ];

/**
 * The flags of a case: what the rules find in its record, and what its sheet says against it or leaves out. Drafted words cannot
 * disagree with the facts that they were made from, so only what people wrote is read.
 */
export const checkCase = (record: CaseRecord, sheet: Sheet, settings: Settings = {}): Flag[] => {
  const statements = sheet.sections.flatMap((section) => section.statements);
  const ofSheet = [
    ...statements.filter(isTyped).flatMap((statement) => deniedWords(statement, record)),
    ...statements.flatMap(takenOut),
  ];
  const found = checkRecord(record, settings);
  if (ofSheet.length === 0) return found;
  return [...found, ...ofSheet].sort((a, b) => levels.indexOf(a.level) - levels.indexOf(b.level));
};
