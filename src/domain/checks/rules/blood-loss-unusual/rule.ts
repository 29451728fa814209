import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'blood-loss-unusual',
  family: 'standards',
  level: 'caution',
  title: 'More blood loss than eye surgery has',
  why: 'A nought too many is the usual cause.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  unless: ['blood-loss-against-figure'],
  check: ({ endOfCase }) => {
    const ml = endOfCase?.bloodLossMl;
    return ml === undefined || ml <= 50
      ? []
      : [
          {
            fields: ['endOfCase.bloodLossMl'],
            message: `A blood loss of ${numberWords(ml)} mL is recorded.`,
          },
        ];
  },
  examples: {
    fires: [
      {
        name: '200 mL',
        fields: 'endOfCase.bloodLossMl',
        record: { endOfCase: { bloodLoss: 'measured', bloodLossMl: 200 } },
      },
    ],
    silent: [{ name: '5 mL', record: { endOfCase: { bloodLoss: 'measured', bloodLossMl: 5 } } }],
    unknown: [{ name: 'not measured', record: { endOfCase: { bloodLoss: 'minimal' } } }],
  },
});
