import { readFileSync } from 'node:fs';
import { type RecordIssue, readRecord } from '../../src/domain/record/read.ts';
import type { CaseRecord } from '../../src/domain/record/schema.ts';

/** Bad input: one clear line, exit 2. */
export class BadInput extends Error {}

/** The text of a file, or of standard input for `-`. */
export const textOf = (file: string | undefined): string => {
  if (file === undefined) throw new BadInput('name a file, or - for standard input');
  try {
    return readFileSync(file === '-' ? 0 : file, 'utf8');
  } catch {
    throw new BadInput(`cannot read ${file}`);
  }
};

export const jsonOf = (text: string, name: string): unknown => {
  try {
    return JSON.parse(text);
  } catch {
    throw new BadInput(`${name} is not JSON`);
  }
};

const shown = 3;

const issueLine = (issues: readonly RecordIssue[]): string => {
  const first = issues
    .slice(0, shown)
    .map(({ path, message }) => (path === '' ? message : `${path}: ${message}`));
  const more = issues.length > shown ? `; and ${issues.length - shown} more` : '';
  return `not a record: ${first.join('; ')}${more}`;
};

export const recordFrom = (value: unknown): CaseRecord => {
  const read = readRecord(value);
  if (!read.ok) throw new BadInput(issueLine(read.error));
  return read.value;
};

export const recordOf = (file: string | undefined): CaseRecord =>
  recordFrom(jsonOf(textOf(file), file ?? ''));

/** Prints as JSON. */
export const print = (value: unknown): void => {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`);
};

/** Value of an option, `--name value`, taken out of the arguments. */
export const takeOption = (args: string[], name: string): string | undefined => {
  const at = args.indexOf(name);
  if (at < 0) return undefined;
  const [, value] = args.splice(at, 2);
  if (value === undefined) throw new BadInput(`${name} needs a value`);
  return value;
};
