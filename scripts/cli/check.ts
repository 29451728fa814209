import { checkRecord } from '../../src/domain/checks/engine.ts';
import { type Flag, type Level, levels } from '../../src/domain/checks/flag.ts';
import { BadInput, jsonOf, print, recordFrom, takeOption, textOf } from './input.ts';

const countBy = (flags: readonly Flag[]) =>
  Object.fromEntries(levels.map((level) => [level, flags.filter((flag) => flag.level === level).length]));

const failing = (flags: readonly Flag[], level: Level | undefined): boolean =>
  level !== undefined && flags.some((flag) => levels.indexOf(flag.level) <= levels.indexOf(level));

const levelOf = (name: string | undefined): Level | undefined => {
  if (name === undefined) return undefined;
  const level = levels.find((one) => one === name);
  if (level === undefined) throw new BadInput(`--fail-on takes ${levels.join(', ')}`);
  return level;
};

/** A whole file is one record; several lines of JSON are many. */
const parse = (
  text: string,
  name: string,
): { value: unknown; isMany: false } | { values: unknown[]; isMany: true } => {
  try {
    return { value: JSON.parse(text), isMany: false };
  } catch {
    const lines = text.split('\n').filter((line) => line.trim() !== '');
    if (lines.length < 2) throw new BadInput(`${name} is not JSON`);
    return { values: lines.map((line, at) => jsonOf(line, `line ${at + 1} of ${name}`)), isMany: true };
  }
};

/** check FILE [--fail-on LEVEL]: exit 1 when a flag of that level or a worse one is found. */
export const check = (args: string[]): number => {
  const level = levelOf(takeOption(args, '--fail-on'));
  const name = args[0] ?? '';
  const input = parse(textOf(args[0]), name);
  if (!input.isMany) {
    const flags = checkRecord(recordFrom(input.value));
    print(flags);
    return failing(flags, level) ? 1 : 0;
  }
  const results = input.values.map((value, at) => ({ line: at + 1, flags: checkRecord(recordFrom(value)) }));
  const all = results.flatMap(({ flags }) => flags);
  const rules = new Map<string, number>();
  for (const { rule } of all) rules.set(rule, (rules.get(rule) ?? 0) + 1);
  const byRule = Object.fromEntries([...rules].sort((a, b) => b[1] - a[1]));
  print({ results, summary: { records: results.length, ...countBy(all), byRule } });
  return failing(all, level) ? 1 : 0;
};
