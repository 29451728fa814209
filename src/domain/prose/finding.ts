import type { CaseRecord } from '../record/schema.ts';
import type { Clause } from './clause.ts';

export const proseKinds = [
  'side',
  'agent',
  'concentration',
  'clock-hour',
  'quadrant',
  'length',
  'count',
  'material',
  'lens',
  'macula',
  'posture',
  'duration',
  'date',
  'medicine',
  'negation',
] as const;

export type ProseKind = (typeof proseKinds)[number];

/** Words of a text that a recorded fact denies. */
export interface ProseFinding {
  kind: ProseKind;
  /** Offsets into the text, end exclusive. */
  start: number;
  end: number;
  /** The very words. */
  words: string;
  /** The recorded field that denies them. */
  field: string;
  /** What is recorded there, as words. */
  recorded: string;
}

/** Reads one clause and holds it against the record. What is not recorded denies nothing. */
export type Reader = (clause: Clause, record: CaseRecord) => ProseFinding[];

/** A finding on the words between two offsets of the clause. */
export const deny = (
  kind: ProseKind,
  clause: Clause,
  match: { index: number; length: number },
  field: string,
  recorded: string,
): ProseFinding => ({
  kind,
  start: clause.start + match.index,
  end: clause.start + match.index + match.length,
  words: clause.text.slice(match.index, match.index + match.length),
  field,
  recorded,
});

export const spanOf = (match: RegExpMatchArray | RegExpExecArray): { index: number; length: number } => ({
  index: match.index ?? 0,
  length: match[0].trimEnd().length,
});
