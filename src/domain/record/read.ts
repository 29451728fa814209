import type { z } from 'zod';
import { ok, type Result } from '../result.ts';
import { type CaseRecord, caseRecord, RECORD_VERSION } from './schema.ts';

/** What is wrong at one place of a record: `path` is dotted, `buckle.elements.0.widthMm`. */
export interface RecordIssue {
  path: string;
  message: string;
}

/** A record of an older version is upgraded step by step; a newer one is refused rather than guessed at. */
const upgrade = (input: unknown): unknown => {
  if (typeof input !== 'object' || input === null || Array.isArray(input)) return input;
  return 'version' in input ? input : { version: RECORD_VERSION, ...input };
};

const toIssue = (issue: z.core.$ZodIssue): RecordIssue => {
  // A union hides the branch that was meant: the deepest issue is the one that helps.
  if (issue.code === 'invalid_union') {
    const nested = issue.errors.flat().sort((a, b) => b.path.length - a.path.length)[0];
    if (nested !== undefined && nested.path.length > 0) {
      const inner = toIssue(nested);
      return { path: [...issue.path.map(String), inner.path].join('.'), message: inner.message };
    }
  }
  return { path: issue.path.map(String).join('.'), message: issue.message };
};

/** Reads a record from JSON that came from outside. Errors: every place that does not fit the schema. */
export const readRecord = (input: unknown): Result<CaseRecord, RecordIssue[]> => {
  const parsed = caseRecord.safeParse(upgrade(input));
  return parsed.success ? ok(parsed.data) : { ok: false, error: parsed.error.issues.map(toIssue) };
};
