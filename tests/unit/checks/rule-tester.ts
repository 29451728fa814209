import { type Example, families, type Rule } from '../../../src/domain/checks/define-rule.ts';
import { labelOf, numberWords } from '../../../src/domain/drafting/words.ts';
import { specsOnPath } from '../../../src/domain/record/field-tree.ts';
import { valueAt } from '../../../src/domain/record/paths.ts';
import { readRecord } from '../../../src/domain/record/read.ts';
import type { CaseRecord } from '../../../src/domain/record/schema.ts';

/* What a rule has to be. Each function names what is wrong; an empty list is a pass. */

/** The record of an example, held against the schema. */
export const recordOf = ({ record }: Pick<Example, 'record'>): CaseRecord => {
  const read = readRecord({ version: 1, ...record });
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  return read.value;
};

export const faultsOfForm = (rule: Rule): string[] => {
  const { id, family, level, title, why, source, answerable } = rule;
  return [
    /^[a-z0-9]+(?:-[a-z0-9]+)+$/.test(id) ? '' : 'the id is not in kebab case',
    families.includes(family) ? '' : 'the family is unknown',
    title.length > 10 && !title.endsWith('.') ? '' : 'the title is not a title',
    /^[A-Z0-9].{15,}[.]$/su.test(why) ? '' : 'the reason is not a sentence',
    why.length <= 200 ? '' : 'the reason is too long for one sentence',
    source.text.length > 3 ? '' : 'there is no source',
    level === 'contradiction' && answerable ? 'a contradiction is answerable' : '',
    level === 'caution' && !answerable ? 'a caution is not answerable' : '',
    /\b(?:must|should|please|need to|has to)\b/i.test(title) ? 'the title instructs' : '',
  ].filter((fault) => fault !== '');
};

export const faultsOfExamples = ({ id, examples: { fires, silent, unknown } }: Rule): string[] => {
  const all = [...fires, ...silent, ...unknown];
  const names = all.map(({ name }) => name);
  const records = all.map(({ record }) => JSON.stringify(record));
  return [
    fires.length > 0 ? '' : 'nothing fires',
    silent.length > 0 ? '' : 'nothing stays silent',
    // What a standard requires is never unknown: it is there or missing.
    unknown.length > 0 || id.startsWith('required-') ? '' : 'nothing is unknown',
    new Set(records).size === records.length ? '' : 'an example comes twice',
    new Set(names).size === names.length ? '' : 'a name comes twice',
  ].filter((fault) => fault !== '');
};

const units =
  /^(?:%| ?(?:mm|mL|mmHg|mW|ms|cSt|D|hours?|days?|weeks?|months?|years?|minutes|clock hours|ports?|gauge|quadrants?|recti|applications|fixations|h)\b|°| of \d|, less| times|-piece| (?:breaks?|elements?|implants?) (?:is|are)\b)/;

/** Words in which a figure needs no unit: dates, times, hours on the clock, numbered things, names with figures in them. */
const unitless = [
  /\d{1,2} (?:January|February|March|April|May|June|July|August|September|October|November|December) \d{4}/g,
  /\d{1,2}:\d{2}/g,
  /[\d.]+ o’clock/g,
  /(?:breaks?|elements?|fixation|treatment|assistant|patch|retinotomy|posture|implant)(?: \d+(?:, \d+)*(?: and \d+)?)/gi,
  /(?:SF|C\dF|C3F)\d|\b(?:C[123PA]|D[123])\b|H33\.\d|polyglactin 910/g,
  /the (?:1983|1991) classification/g,
  /“[^”]*”/g,
  // Visual acuity.
  /\d+\/\d+/g,
];

const bareFigures = (message: string): string[] => {
  const rest = unitless.reduce((text, pattern) => text.replace(pattern, '·'), message);
  return [...rest.matchAll(/\d+(?:\.\d+)?(?:[–-]\d+(?:\.\d+)?)?/g)]
    .filter((match) => {
      const after = rest.slice(match.index + match[0].length);
      // "7 to 9 mm": the unit follows the second figure.
      return !units.test(after.replace(/^ (?:to|and) \d+(?:\.\d+)?/, ''));
    })
    .map((match) => match[0]);
};

/** The ways in which a value of the record may stand in a message. */
const spoken = (record: CaseRecord, field: string): string[] => {
  const value = valueAt(record, field);
  if (typeof value === 'number') return [numberWords(value), String(Math.floor(value))];
  if (typeof value === 'string') return [value, labelOf(field, value), String(Number(value.slice(8, 10)))];
  if (typeof value === 'boolean') return [];
  if (Array.isArray(value)) return [String(value.length), ...value.map((one) => labelOf(field, String(one)))];
  return [];
};

const named = (record: CaseRecord, fields: readonly string[], message: string): boolean => {
  const words = fields.flatMap((field) => spoken(record, field)).filter((word) => word !== 'NaN');
  const plain = message.toLowerCase();
  return words.length === 0 || words.some((word) => plain.includes(word.toLowerCase()));
};

/** What is wrong with what a rule says of a record on which it fires. */
export const faultsOfMessages = (rule: Rule, record: CaseRecord): string[] =>
  rule
    .check(record)
    .flatMap(({ fields, message }) =>
      [
        /^[^a-z].{9,}[.]$/su.test(message) ? '' : 'it is not a sentence',
        /undefined|null|NaN|\[object| {2}|\.\.| \.| ,/.test(message) ? 'it is not tidy' : '',
        /\b(?:please|must|should|check that|make sure|verify|consider)\b/i.test(message)
          ? 'it instructs'
          : '',
        ...bareFigures(message).map((figure) => `${figure} has no unit`),
        fields.length > 0 ? '' : 'it names no field',
        ...fields.map((field) => (specsOnPath(field).length > 0 ? '' : `${field} does not exist`)),
        rule.level !== 'contradiction' || named(record, fields, message)
          ? ''
          : 'it names no value of the fields it leads to',
      ]
        .filter((fault) => fault !== '')
        .map((fault) => `${fault}: ${message}`),
    );
