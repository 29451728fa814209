import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'pseudophakic-without-cataract-surgery',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A pseudophakic eye that never had an operation',
  why: 'Lens state decides gas, oil and refraction.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    const before = record.before?.previousOperations;
    if (record.before?.lens !== 'pseudophakic' || before === undefined) return [];
    const other =
      Array.isArray(before) &&
      eye !== undefined &&
      before.every((one) => one.eye !== undefined && one.eye !== eye);
    if (before !== 'none' && !other) return [];
    const said =
      before === 'none'
        ? 'previous eye operations are recorded as none'
        : `previous operations are recorded for the ${eye === 'left' ? 'right' : 'left'} eye only`;
    return [
      {
        fields: ['before.lens', 'before.previousOperations'],
        message: `The eye is recorded as pseudophakic; ${said}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no operation',
        fields: 'before.lens',
        record: { before: { lens: 'pseudophakic', previousOperations: 'none' } },
      },
    ],
    silent: [
      {
        name: 'cataract surgery',
        record: {
          who: { eye: 'left' },
          before: { lens: 'pseudophakic', previousOperations: [{ what: 'cataract', eye: 'left' }] },
        },
      },
      {
        name: 'lens exchanged for refraction',
        record: {
          who: { eye: 'left' },
          before: { lens: 'pseudophakic', previousOperations: [{ what: 'refractive-surgery', eye: 'left' }] },
        },
      },
    ],
    unknown: [{ name: 'history not recorded', record: { before: { lens: 'pseudophakic' } } }],
  },
});
