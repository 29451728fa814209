import type { CaseRecord } from '../record/schema.ts';
import type { Level } from './flag.ts';

export const families = [
  'side',
  'time',
  'team',
  'diagnosis',
  'breaks',
  'buckle',
  'tension',
  'closure',
  'vitreous',
  'drainage',
  'retinopexy',
  'tamponade',
  'posture',
  'aftercare',
  'implants',
  'medicines',
  'refraction',
  'standards',
  'letters',
] as const;

export type Family = (typeof families)[number];

/** What a check found at one place. */
export interface Finding {
  /** Paths to go to, the most useful first. */
  fields: string[];
  message: string;
}

type PartialRecord = Omit<CaseRecord, 'version'>;

export interface Example {
  /** What the example shows, in a few words. */
  name: string;
  record: PartialRecord;
}

/** One thing a careful reader would catch. Permanent: an id is never reused for something else. */
export interface Rule {
  id: string;
  family: Family;
  level: Level;
  title: string;
  /** Why it matters, in one sentence for the person at the desk. */
  why: string;
  /** Where it comes from, and how sure that is: R read, R2 read second-hand, M from memory, C computed, P common practice. */
  source: { text: string; certainty: 'R' | 'R2' | 'M' | 'C' | 'P' };
  /** Whether a reason may answer it. Never true of a contradiction. */
  answerable: boolean;
  /** Rules that say the same more exactly: where one of them fires on the same item, this one is silent. */
  unless?: readonly string[];
  /** Pure; what is absent is unknown, and unknown is never a contradiction. */
  check: (record: CaseRecord) => Finding[];
  examples: {
    /** Each fires this rule at least once; `fields` names the first field of the first flag. */
    fires: (Example & { fields: string })[];
    /** Each is sound. */
    silent: Example[];
    /** Each lacks the facts to tell, so that nothing is said. */
    unknown: Example[];
  };
}

export const defineRule = (rule: Rule): Rule => rule;
