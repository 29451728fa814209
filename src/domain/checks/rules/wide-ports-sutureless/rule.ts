import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'wide-ports-sutureless',
  family: 'vitreous',
  level: 'caution',
  title: '20-gauge sclerotomies without sutures',
  why: 'Ports of that width leak; a leak lets the gas out and germs in.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ vitreous }) =>
    vitreous?.gauge === '20' && vitreous.sclerotomyClosure === 'sutureless'
      ? [
          {
            fields: ['vitreous.sclerotomyClosure', 'vitreous.gauge'],
            message: 'The sclerotomies are recorded as 20 gauge and sutureless.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: '20 gauge',
        fields: 'vitreous.sclerotomyClosure',
        record: { vitreous: { gauge: '20', sclerotomyClosure: 'sutureless' } },
      },
    ],
    silent: [{ name: '25 gauge', record: { vitreous: { gauge: '25', sclerotomyClosure: 'sutureless' } } }],
    unknown: [{ name: 'gauge not recorded', record: { vitreous: { sclerotomyClosure: 'sutureless' } } }],
  },
});
