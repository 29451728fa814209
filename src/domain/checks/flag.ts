import type { FieldPath } from '../record/paths.ts';

export const levels = ['contradiction', 'omission', 'caution'] as const;

/** Two things that cannot both be true; what the rest makes necessary is missing; worth a second look. */
export type Level = (typeof levels)[number];

export interface Flag {
  /** Permanent id of the rule. */
  rule: string;
  level: Level;
  /** Where to go, the most useful field first. */
  fields: FieldPath[];
  /** What was found, in the case's own values. */
  message: string;
  /** Whether a reason may answer it; otherwise only the record can. */
  answerable: boolean;
  /** Statement of the sheet whose words it is about, where it is about words. */
  statement?: string;
}

/** A reason given for leaving a flag as it is. It counts only as long as the flag says the same. */
export interface Answer {
  flag: string;
  reason: string;
  /** Who answered, as printed in the note. */
  by: string;
  /** Instant, ISO 8601. */
  at: string;
}

/** What an answer holds on to: rule, places and wording, so that a changed value asks again. */
export const flagKey = (flag: Flag): string => [flag.rule, flag.fields.join(','), flag.message].join('|');

export const isAnswered = (flag: Flag, answers: readonly Answer[]): boolean =>
  flag.answerable && answers.some((answer) => answer.flag === flagKey(flag));

/** Flags that stand in the way of a signature: contradictions always, omissions until answered. */
export const blocking = (flags: readonly Flag[], answers: readonly Answer[]): Flag[] =>
  flags.filter(
    (flag) => flag.level === 'contradiction' || (flag.level === 'omission' && !isAnswered(flag, answers)),
  );
