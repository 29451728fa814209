import { type Answer, type Flag, isAnswered, levels } from '../../domain/checks/flag.ts';
import type { Sheet, Statement } from '../../domain/drafting/sheet.ts';
import { covers } from '../../domain/record/paths.ts';
import { type Stage, stages } from '../../domain/record/schema.ts';
import { standing } from './sheet-doc.ts';

export const stageOf = (flag: Flag): Stage => {
  const key = flag.fields[0]?.split('.')[0];
  return stages.find((stage) => stage === key) ?? 'who';
};

const rank = (flag: Flag) => levels.indexOf(flag.level) * stages.length + stages.indexOf(stageOf(flag));

/** Worst first; within a level in the order of the operation. */
export const worstFirst = (flags: readonly Flag[]): Flag[] => [...flags].sort((a, b) => rank(a) - rank(b));

export const openFlags = (flags: readonly Flag[], answers: readonly Answer[]): Flag[] =>
  worstFirst(flags.filter((flag) => !isAnswered(flag, answers)));

export const countsByLevel = (flags: readonly Flag[]) =>
  levels.map((level) => ({ level, count: flags.filter((flag) => flag.level === level).length }));

const plurals = { contradiction: 'contradictions', omission: 'omissions', caution: 'cautions' } as const;

/** "2 contradictions". */
export const countInWords = (count: number, level: Flag['level']): string =>
  `${count} ${count === 1 ? level : plurals[level]}`;

const meets = (field: string, read: string) => covers(field, read) || covers(read, field);

/** How well a statement's facts are those of a flag; the first field counts most. */
const closeness = (flag: Flag, statement: Statement): number =>
  flag.fields.reduce(
    (sum, field, index) =>
      statement.reads.some((read) => meets(field, read)) ? sum + (index === 0 ? 3 : 1) : sum,
    0,
  );

const best = <T>(items: readonly T[], score: (item: T) => number): T | undefined => {
  let found: T | undefined;
  let most = 0;
  for (const item of items) {
    const points = score(item);
    if (points > most) {
      found = item;
      most = points;
    }
  }
  return found;
};

const sharedKeys = (a: string, b: string) => {
  const [left, right] = [a.split('.'), b.split('.')];
  let length = 0;
  while (length < left.length && left[length] === right[length]) length += 1;
  return length;
};

export interface PlacedFlag {
  flag: Flag;
  /** Statement that the flag stands beside. */
  beside: string | null;
  /** Whether that statement's words are what the flag is about. */
  underlaid: boolean;
}

/**
 * Where each flag stands beside the sheet: at the statement that rests on its fields, the one that rests on little
 * else being the best; failing that, level with a statement about the same part of the record; failing that, nowhere.
 */
export const placeFlags = (flags: readonly Flag[], sheet: Sheet): PlacedFlag[] => {
  const statements = sheet.sections.flatMap(standing);
  return flags.map((flag) => {
    if (flag.statement !== undefined) return { flag, beside: flag.statement, underlaid: true };
    const about = best(statements, (statement) => {
      const points = closeness(flag, statement);
      return points === 0 ? 0 : points + 1 / (1 + statement.reads.length);
    });
    if (about !== undefined) return { flag, beside: about.id, underlaid: true };
    const first = flag.fields[0] ?? '';
    const near = best(statements, (statement) => {
      const shared = Math.max(0, ...statement.reads.map((read) => sharedKeys(first, read)));
      return shared === 0 ? 0 : shared + 1 / (1 + statement.reads.length);
    });
    return { flag, beside: near?.id ?? null, underlaid: false };
  });
};
