import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'fluid-against-flat',
  family: 'drainage',
  level: 'contradiction',
  title: 'The retina is flat and fluid is left, or detached and every break closed',
  why: 'What was left at the end decides when the eye is seen again.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ endOfCase }) => {
    if (endOfCase?.retina !== 'flat') return [];
    if (endOfCase.fluidLeftWhere !== undefined) {
      return [
        {
          fields: ['endOfCase.retina', 'endOfCase.fluidLeftWhere'],
          message: `The retina is recorded as flat, and fluid as left ${endOfCase.fluidLeftWhere}.`,
        },
      ];
    }
    if (endOfCase.breaksClosed === 'none') {
      return [
        {
          fields: ['endOfCase.retina', 'endOfCase.breaksClosed'],
          message: 'The retina is recorded as flat, and no break as closed.',
        },
      ];
    }
    return [];
  },
  examples: {
    fires: [
      {
        name: 'flat with fluid',
        fields: 'endOfCase.retina',
        record: { endOfCase: { retina: 'flat', fluidLeftWhere: 'inferiorly' } },
      },
    ],
    silent: [
      { name: 'fluid left', record: { endOfCase: { retina: 'fluid-left', fluidLeftWhere: 'inferiorly' } } },
    ],
    unknown: [{ name: 'retina not recorded', record: { endOfCase: { fluidLeftWhere: 'inferiorly' } } }],
  },
});
