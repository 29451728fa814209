import { rules } from '../../domain/checks/registry.ts';

export interface Explanation {
  why: string;
  source: string;
}

/** Why a rule matters and where it comes from, by its id. */
export type Explain = (rule: string) => Explanation | undefined;

const certainties = {
  R: 'read in the source',
  R2: 'read in a secondary source',
  M: 'from memory of the source',
  C: 'computed',
  P: 'common practice',
} as const;

export const explain: Explain = (id) => {
  const rule = rules.find((one) => one.id === id);
  return rule === undefined
    ? undefined
    : { why: rule.why, source: `${rule.source.text} (${certainties[rule.source.certainty]})` };
};
