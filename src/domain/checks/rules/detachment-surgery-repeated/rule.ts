import { defineRule } from '../../define-rule.ts';
import { labelOf, previousOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'detachment-surgery-repeated',
  family: 'diagnosis',
  level: 'caution',
  title: 'A first detachment in an eye that had surgery for detachment before',
  why: 'A recurrence has another prognosis and another modifier.',
  source: { text: 'CPT modifier 78: return for recurrence', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const eye = record.who?.eye;
    if (eye === undefined || record.before?.recurrent !== false) return [];
    const index = previousOf(record).findIndex(
      (one) =>
        one.eye === eye &&
        (one.what === 'vitrectomy' ||
          one.what === 'scleral-buckle' ||
          one.what === 'encircling-band' ||
          one.what === 'pneumatic-retinopexy'),
    );
    if (index < 0) return [];
    const what = labelOf('before.previousOperations.what', previousOf(record)[index]?.what ?? '');
    return [
      {
        fields: ['before.recurrent', `before.previousOperations.${index}.what`],
        message: `The detachment is recorded as not recurrent; the ${eye} eye had a ${what} before.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'buckle before',
        fields: 'before.recurrent',
        record: {
          who: { eye: 'left' },
          before: { recurrent: false, previousOperations: [{ what: 'scleral-buckle', eye: 'left' }] },
        },
      },
    ],
    silent: [
      {
        name: 'in the fellow eye',
        record: {
          who: { eye: 'left' },
          before: { recurrent: false, previousOperations: [{ what: 'scleral-buckle', eye: 'right' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'recurrence not recorded',
        record: {
          who: { eye: 'left' },
          before: { previousOperations: [{ what: 'scleral-buckle', eye: 'left' }] },
        },
      },
    ],
  },
});
