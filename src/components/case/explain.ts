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

const ofSheet: Readonly<Record<string, Explanation>> = {
  'words-against-record': {
    why: 'The note and the facts behind it must not say different things.',
    source: 'Elghrably, Eye 2008;22:340 (read in the source)',
  },
  'required-statement-taken-out': {
    why: 'A note without this statement lacks what the published standards require.',
    source: '42 CFR 482.51(b)(6), tag A-0959 (read in a secondary source)',
  },
};

export const explain: Explain = (id) => {
  const rule = rules.find((one) => one.id === id);
  return rule === undefined
    ? ofSheet[id]
    : { why: rule.why, source: `${rule.source.text} (${certainties[rule.source.certainty]})` };
};
