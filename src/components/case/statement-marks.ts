import { isAnswered, type Level, levels } from '../../domain/checks/flag.ts';
import type { Statement } from '../../domain/drafting/sheet.ts';
import { covers } from '../../domain/record/paths.ts';
import type { DeskState } from './desk-store.ts';
import { placeFlags } from './flag-order.ts';
import { standing } from './sheet-doc.ts';

/** Classes that a statement wears in the sheet, by its id. */
export type StatementMarks = ReadonlyMap<string, string>;

const worse = (a: Level | undefined, b: Level) =>
  a === undefined || levels.indexOf(b) < levels.indexOf(a) ? b : a;

const isLit = (statement: Statement, field: string | null) =>
  field !== null && statement.reads.some((read) => covers(field, read) || covers(read, field));

/** What the sheet shows about each statement: the level of its flags, and whether the field in hand is one of its facts. */
export const statementMarks = (state: DeskState): StatementMarks => {
  const open = state.flags.filter((flag) => !isAnswered(flag, state.answers));
  const flagged = new Map<string, Level>();
  for (const { flag, beside, underlaid } of placeFlags(open, state.sheet)) {
    if (beside !== null && underlaid) flagged.set(beside, worse(flagged.get(beside), flag.level));
  }
  const marks = new Map<string, string>();
  for (const statement of state.sheet.sections.flatMap(standing)) {
    const level = flagged.get(statement.id);
    const classes = [
      level === undefined ? '' : `marked-${level}`,
      isLit(statement, state.field) ? 'marked-lit' : '',
    ].filter((name) => name !== '');
    if (classes.length > 0) marks.set(statement.id, classes.join(' '));
  }
  return marks;
};
