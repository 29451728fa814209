import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'drained-through-missing-break',
  family: 'drainage',
  level: 'contradiction',
  title: 'Drained through the break, and no break was found',
  why: 'Either a break is missing from the record or the drainage went another way.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ drainage, breaks }) =>
    drainage?.internalThrough === 'break' && breaks?.found === 'none'
      ? [
          {
            fields: ['drainage.internalThrough', 'breaks.found'],
            message: 'Fluid was drained internally through the break; breaks are recorded as none.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'no break',
        fields: 'drainage.internalThrough',
        record: { drainage: { kind: 'internal', internalThrough: 'break' }, breaks: { found: 'none' } },
      },
    ],
    silent: [
      {
        name: 'a break',
        record: {
          drainage: { kind: 'internal', internalThrough: 'break' },
          breaks: { found: [{ kind: 'horseshoe' }] },
        },
      },
    ],
    unknown: [
      { name: 'breaks not recorded', record: { drainage: { kind: 'internal', internalThrough: 'break' } } },
    ],
  },
});
