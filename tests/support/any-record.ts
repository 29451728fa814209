import fc from 'fast-check';
import { type FieldSpec, fieldTree } from '../../src/domain/record/field-tree.ts';
import { readRecord } from '../../src/domain/record/read.ts';
import type { CaseRecord } from '../../src/domain/record/schema.ts';

const day = fc
  .date({ min: new Date('1930-01-01'), max: new Date('2030-12-31'), noInvalidDate: true })
  .map((date) => date.toISOString().slice(0, 10));

const sentence = fc.constantFrom(
  'as usual',
  'Larkfield',
  'no remark; see the plan',
  'A. Surgeon',
  '5-0',
  'x',
);

const givenValue = (spec: FieldSpec): fc.Arbitrary<unknown> => {
  switch (spec.kind) {
    case 'group':
      return group(spec.fields);
    case 'list':
      return fc.array(group(spec.fields), { minLength: 1, maxLength: 4 });
    case 'choice':
      return fc.constantFrom(...Object.keys(spec.options));
    case 'choices':
      return fc.subarray(Object.keys(spec.options), { minLength: 1 });
    case 'number':
      return spec.unit === 'o’clock'
        ? fc.integer({ min: 4, max: 51 }).map((quarters) => quarters / 4)
        : fc.integer({ min: Math.ceil(spec.min), max: Math.min(spec.max, 100) });
    case 'numbers':
      return fc.uniqueArray(fc.integer({ min: 1, max: 5 }), { minLength: 1, maxLength: 3 });
    case 'yes-no':
      return fc.boolean();
    case 'date':
      return day;
    case 'date-time':
      return day.map((date) => `${date}T10:15`);
    default:
      return sentence;
  }
};

const fieldValue = (spec: FieldSpec): fc.Arbitrary<unknown> => {
  const words = Object.keys(spec.words);
  return words.length === 0 ? givenValue(spec) : fc.oneof(fc.constantFrom(...words), givenValue(spec));
};

const group = (fields: readonly FieldSpec[]): fc.Arbitrary<Record<string, unknown>> =>
  fc.record(Object.fromEntries(fields.map((field) => [field.name, fieldValue(field)])), { requiredKeys: [] });

/** Any record that the schema allows, however odd and however little of it is filled in. */
export const anyRecord: fc.Arbitrary<CaseRecord> = group(fieldTree).map((stages) => {
  const read = readRecord({ version: 1, ...stages });
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  return read.value;
});
