import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'fluid-left-where-missing',
  family: 'drainage',
  level: 'omission',
  title: 'Fluid was left, and where is not recorded',
  why: 'Whether it lies under the macula or over the buckle decides when the eye is seen again.',
  source: { text: 'RC.02.01.03: each finding', certainty: 'R' },
  answerable: true,
  check: ({ endOfCase }) =>
    endOfCase?.retina === 'fluid-left' && endOfCase.fluidLeftWhere === undefined
      ? [
          {
            fields: ['endOfCase.fluidLeftWhere'],
            message: 'Some subretinal fluid is recorded as left; where is not.',
          },
        ]
      : [],
  examples: {
    fires: [
      { name: 'where', fields: 'endOfCase.fluidLeftWhere', record: { endOfCase: { retina: 'fluid-left' } } },
    ],
    silent: [
      { name: 'said', record: { endOfCase: { retina: 'fluid-left', fluidLeftWhere: 'below' } } },
      { name: 'flat', record: { endOfCase: { retina: 'flat' } } },
    ],
    unknown: [{ name: 'retina not recorded', record: { endOfCase: { pressureMmHg: 12 } } }],
  },
});
