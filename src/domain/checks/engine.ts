import { type CaseRecord, stages } from '../record/schema.ts';
import type { Rule } from './define-rule.ts';
import { type Flag, levels } from './flag.ts';
import { rules } from './registry.ts';

export { RULES_VERSION } from './registry.ts';

/**
 * What a unit has settled about cautions, by rule: taken as an omission, or switched off. Contradictions and omissions are the same
 * everywhere; what is said of them here has no effect.
 */
export type Settings = Readonly<Record<string, 'omission' | 'off'>>;

const stageOrder = new Map<string, number>(stages.map((stage, index) => [stage, index]));

const stageOf = (flag: Flag): number => stageOrder.get(flag.fields[0]?.split('.')[0] ?? '') ?? stages.length;

const levelOf = (rule: Rule, settings: Settings): Flag['level'] | 'off' =>
  rule.level === 'caution' ? (settings[rule.id] ?? 'caution') : rule.level;

const run = (rule: Rule, record: CaseRecord, settings: Settings): Flag[] => {
  const level = levelOf(rule, settings);
  if (level === 'off') return [];
  return rule.check(record).map(({ fields, message }) => ({
    rule: rule.id,
    level,
    fields,
    message,
    answerable: rule.answerable,
  }));
};

/** The items of lists that a flag names: `breaks.found.0`, `buckle.elements.1`. */
const itemsOf = ({ fields }: Flag): string[] =>
  fields.flatMap((field) => /^\w+\.\w+\.\d+/.exec(field)?.[0] ?? []);

/** Whether two flags may be about the same thing: not when both name items of lists, and none in common. */
const mayBeOne = (a: Flag, b: Flag): boolean => {
  const items = itemsOf(a);
  const others = itemsOf(b);
  return items.length === 0 || others.length === 0 || items.some((item) => others.includes(item));
};

const exactOver: ReadonlyMap<string, readonly string[]> = new Map(
  rules.flatMap(({ id, unless }) => (unless === undefined ? [] : [[id, unless]])),
);

/** Without the flags that a more exact rule has raised about the same thing: one cause, one flag. */
const folded = (flags: readonly Flag[]): Flag[] =>
  flags.filter((flag) => {
    const exact = exactOver.get(flag.rule);
    return exact === undefined || !flags.some((other) => exact.includes(other.rule) && mayBeOne(flag, other));
  });

/**
 * Everything that the rules find in a record, the worst first, then in the order of the operation. Pure, and the same in the browser and on
 * the server. A rule is silent where a more exact one has fired.
 */
export const checkRecord = (record: CaseRecord, settings: Settings = {}): Flag[] =>
  folded(rules.flatMap((rule) => run(rule, record, settings))).sort(
    (a, b) => levels.indexOf(a.level) - levels.indexOf(b.level) || stageOf(a) - stageOf(b),
  );
