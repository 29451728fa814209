import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'measured-blood-loss-missing',
  family: 'standards',
  level: 'omission',
  title: 'Blood loss measured, without the figure',
  why: 'Estimated blood loss is a required item of an operative note.',
  source: { text: 'RC.02.01.03; C-CDA Operative Note, LOINC 59770-8', certainty: 'R' },
  answerable: true,
  check: ({ endOfCase }) =>
    endOfCase?.bloodLoss === 'measured' && endOfCase.bloodLossMl === undefined
      ? [
          {
            fields: ['endOfCase.bloodLossMl'],
            message: 'Blood loss is recorded as measured; the figure in mL is not.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'no figure',
        fields: 'endOfCase.bloodLossMl',
        record: { endOfCase: { bloodLoss: 'measured' } },
      },
    ],
    silent: [{ name: 'minimal', record: { endOfCase: { bloodLoss: 'minimal' } } }],
    unknown: [{ name: 'not recorded', record: { endOfCase: {} } }],
  },
});
