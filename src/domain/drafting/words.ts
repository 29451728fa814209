import { showClock } from '../anatomy/clock.ts';
import { specsOnPath } from '../record/field-tree.ts';

/* How values are put into words. Pure and small: what is said about them stands in the templates. */

const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

const small = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];

/** "1 December 2026" from a day or a local date and time. */
export const dateWords = (iso: string): string => {
  const [year = '', month = '', day = ''] = iso.slice(0, 10).split('-');
  return `${Number(day)} ${months[Number(month) - 1] ?? ''} ${year}`;
};

/** "09:10" from a local date and time. */
export const timeWords = (iso: string): string => iso.slice(11, 16);

/** "3.5", with a point and no needless noughts. */
export const numberWords = (value: number): string => String(Math.round(value * 100) / 100);

/** "three" up to twelve, figures beyond. */
export const countWords = (value: number): string => small[value] ?? String(value);

/** "once", "twice", "three times". */
export const timesWords = (value: number): string =>
  value === 1 ? 'once' : value === 2 ? 'twice' : `${countWords(value)} times`;

/** "a, b and c". */
export const listWords = (items: readonly string[], joint: 'and' | 'or' = 'and'): string =>
  items.length < 2 ? (items[0] ?? '') : `${items.slice(0, -1).join(', ')} ${joint} ${items.at(-1)}`;

/** "4:30", "12 o’clock", "12:30 to 5 o’clock". */
export const clockWords = showClock;

const labelsByPath = new Map<string, Readonly<Record<string, string>>>();

const labelsAt = (path: string): Readonly<Record<string, string>> => {
  const before = labelsByPath.get(path);
  if (before !== undefined) return before;
  const spec = specsOnPath(path).at(-1);
  const found = { ...spec?.words, ...(spec !== undefined && 'options' in spec ? spec.options : {}) };
  labelsByPath.set(path, found);
  return found;
};

/** The label that the form shows for a value. */
export const labelOf = (path: string, value: string): string => labelsAt(path)[value] ?? value;

/** "a band", "an oval sponge". */
export const withArticle = (noun: string): string =>
  `${/^(?:[aeiou]|8|11\b|18\b)/i.test(noun) && !/^(?:one\b|uni|us|eu)/i.test(noun) ? 'an' : 'a'} ${noun}`;

/** A name in small letters unless it is an abbreviation or a name of its own. */
export const lowerFirst = (text: string): string =>
  /^[A-Z][a-z]/.test(text) ? text.charAt(0).toLowerCase() + text.slice(1) : text;

/** Anything that there is to tidy: most sentences come out of their template without it. */
const untidy = /\s\s|[^\S ]| [,.;:)]|\( |,[,.;]|[.!?]\.$/;

const tidied = (text: string): string =>
  text
    .replace(/\s+/g, ' ')
    .replace(/ ([,.;:)])/g, '$1')
    .replace(/\( /g, '(')
    .replace(/,+(?=[,.;])/g, '')
    .replace(/([.!?])\.+$/g, '$1')
    .trim();

const ends = '.!?';
const hanging = ',;:';

/** One tidy sentence: single spaces, no stray punctuation, a capital at the start, one stop at the end. */
export const tidy = (text: string): string => {
  const trimmed = text.trim();
  if (trimmed === '') return '';
  const words = untidy.test(trimmed) ? tidied(trimmed) : trimmed;
  if (words === '' || /^[.,;:]+$/.test(words)) return '';
  const sentence = words.charAt(0).toUpperCase() + words.slice(1);
  const last = sentence.charAt(sentence.length - 1);
  if (ends.includes(last) || (last === ',' && sentence.startsWith('Dear '))) return sentence;
  return `${hanging.includes(last) ? sentence.slice(0, -1) : sentence}.`;
};
