import type { Sheet } from '../../domain/drafting/sheet.ts';
import { fieldLabel, specsOnPath } from '../../domain/record/field-tree.ts';
import type { FieldPath } from '../../domain/record/paths.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';
import { showClock, showDate, showDateTime } from '../ui/entry.ts';
import { standing } from './sheet-doc.ts';

export interface Difference {
  label: string;
  mine: string;
  theirs: string;
}

const leaves = (value: unknown, path: FieldPath, found: Map<FieldPath, unknown>) => {
  const isPlain = Array.isArray(value) && value.every((item) => typeof item !== 'object');
  if (typeof value === 'object' && value !== null && !isPlain) {
    for (const [key, inner] of Object.entries(value)) {
      leaves(inner, path === '' ? key : `${path}.${key}`, found);
    }
  } else if (path !== 'version') found.set(path, value);
  return found;
};

/** A recorded value as the page shows it, with its unit; "nothing" when absent. */
export const valueInWords = (path: FieldPath, value: unknown): string => {
  const spec = specsOnPath(path).at(-1);
  if (value === undefined) return 'nothing';
  if (Array.isArray(value)) return value.map((item) => valueInWords(path, item)).join(', ');
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  const text = String(value);
  const word = spec?.words[text];
  if (word !== undefined) return word;
  switch (spec?.kind) {
    case 'choice':
    case 'choices':
      return spec.options[text] ?? text;
    case 'number':
      return spec.unit === 'o’clock' ? `${showClock(Number(value))} o’clock` : `${text} ${spec.unit}`.trim();
    case 'date':
      return showDate(text);
    case 'date-time':
      return showDateTime(text);
    default:
      return text;
  }
};

/** What two versions of a case say differently, field by field and statement by statement. */
export const differences = (
  mine: { record: CaseRecord; sheet: Sheet | null },
  theirs: { record: CaseRecord; sheet: Sheet | null },
): Difference[] => {
  const left = leaves(mine.record, '', new Map());
  const right = leaves(theirs.record, '', new Map());
  const facts = [...new Set([...left.keys(), ...right.keys()])]
    .filter((path) => JSON.stringify(left.get(path)) !== JSON.stringify(right.get(path)))
    .map((path) => ({
      label: fieldLabel(path),
      mine: valueInWords(path, left.get(path)),
      theirs: valueInWords(path, right.get(path)),
    }));
  const written = (sheet: Sheet | null) =>
    new Map(
      (sheet?.sections ?? [])
        .flatMap(standing)
        .filter(({ origin }) => origin !== 'drafted')
        .map(({ id, text }) => [id, text]),
    );
  const mineWritten = written(mine.sheet);
  const theirsWritten = written(theirs.sheet);
  const words = [...new Set([...mineWritten.keys(), ...theirsWritten.keys()])]
    .filter((id) => mineWritten.get(id) !== theirsWritten.get(id))
    .map((id) => ({
      label: 'Words written by hand',
      mine: mineWritten.get(id) ?? 'nothing',
      theirs: theirsWritten.get(id) ?? 'nothing',
    }));
  return [...facts, ...words];
};
