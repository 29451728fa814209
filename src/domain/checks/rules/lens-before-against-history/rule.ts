import { defineRule } from '../../define-rule.ts';
import { labelOf, previousOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'lens-before-against-history',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'Phakic after cataract surgery in the same eye',
  why: 'Lens state decides gas, oil and refraction.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    const lens = record.before?.lens;
    if (eye === undefined || (lens !== 'phakic' && lens !== 'cataract')) return [];
    const index = previousOf(record).findIndex((one) => one.what === 'cataract' && one.eye === eye);
    if (index < 0) return [];
    return [
      {
        fields: ['before.lens', `before.previousOperations.${index}.eye`],
        message: `The ${eye} eye is recorded as ${labelOf('before.lens', lens)}, and as having had cataract surgery.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'same eye',
        fields: 'before.lens',
        record: {
          who: { eye: 'left' },
          before: { lens: 'phakic', previousOperations: [{ what: 'cataract', eye: 'left' }] },
        },
      },
    ],
    silent: [
      {
        name: 'fellow eye',
        record: {
          who: { eye: 'left' },
          before: { lens: 'phakic', previousOperations: [{ what: 'cataract', eye: 'right' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'eye of the operation not recorded',
        record: {
          who: { eye: 'left' },
          before: { lens: 'phakic', previousOperations: [{ what: 'cataract' }] },
        },
      },
    ],
  },
});
