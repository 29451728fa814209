import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'blood-loss-against-figure',
  family: 'standards',
  level: 'contradiction',
  title: 'Blood loss in words and in millilitres do not agree',
  why: 'Estimated blood loss is a required item of an operative note.',
  source: { text: 'C-CDA Operative Note: estimated blood loss 59770-8', certainty: 'R' },
  answerable: false,
  check: ({ endOfCase }) => {
    const { bloodLoss, bloodLossMl: ml } = endOfCase ?? {};
    if (ml === undefined || (bloodLoss !== 'none' && bloodLoss !== 'minimal')) return [];
    if (ml <= (bloodLoss === 'none' ? 0 : 20)) return [];
    return [
      {
        fields: ['endOfCase.bloodLossMl', 'endOfCase.bloodLoss'],
        message: `Blood loss is recorded as ${bloodLoss} and as ${numberWords(ml)} mL.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'none and 5 mL',
        fields: 'endOfCase.bloodLossMl',
        record: { endOfCase: { bloodLoss: 'none', bloodLossMl: 5 } },
      },
    ],
    silent: [{ name: 'minimal, 2 mL', record: { endOfCase: { bloodLoss: 'minimal', bloodLossMl: 2 } } }],
    unknown: [{ name: 'not in words', record: { endOfCase: { bloodLossMl: 5 } } }],
  },
});
