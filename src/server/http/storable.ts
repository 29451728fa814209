import type { RecordIssue } from '../../domain/record/read.ts';

/** What neither the database nor the canonical form can hold: the character zero, and half of a surrogate pair. */
const fits = (text: string): boolean => !text.includes('\u0000') && text.isWellFormed();

/** Texts in a JSON value that could not be kept, by path. */
export const unstorable = (value: unknown, path: readonly string[] = []): RecordIssue[] => {
  if (typeof value === 'string') {
    const message = 'holds a character that cannot be kept; delete it and type it again';
    return fits(value) ? [] : [{ path: path.join('.'), message }];
  }
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, part]) => unstorable(part, [...path, key]));
};
