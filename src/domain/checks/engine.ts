import { type CaseRecord, stages } from '../record/schema.ts';
import type { Rule } from './define-rule.ts';
import { type Flag, levels } from './flag.ts';
import { rules } from './registry.ts';

export { RULES_VERSION } from './registry.ts';

const stageOrder = new Map<string, number>(stages.map((stage, index) => [stage, index]));

const stageOf = (flag: Flag): number => stageOrder.get(flag.fields[0]?.split('.')[0] ?? '') ?? stages.length;

const run = (rule: Rule, record: CaseRecord): Flag[] =>
  rule.check(record).map(({ fields, message }) => ({
    rule: rule.id,
    level: rule.level,
    fields,
    message,
    answerable: rule.answerable,
  }));

/**
 * Everything that the rules find in a record, the worst first, then in the order of the operation. Pure, and the same in the browser and on
 * the server. A rule is silent where a more exact one has fired.
 */
export const checkRecord = (record: CaseRecord): Flag[] => {
  const flags = rules.flatMap((rule) => run(rule, record));
  if (flags.length === 0) return flags;
  const fired = new Set(flags.map(({ rule }) => rule));
  const silent = new Set(
    rules.filter(({ unless }) => unless?.some((id) => fired.has(id)) === true).map(({ id }) => id),
  );
  return flags
    .filter(({ rule }) => !silent.has(rule))
    .sort((a, b) => levels.indexOf(a.level) - levels.indexOf(b.level) || stageOf(a) - stageOf(b));
};
