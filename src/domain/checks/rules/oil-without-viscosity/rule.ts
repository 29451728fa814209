import { defineRule } from '../../define-rule.ts';
import { oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'oil-without-viscosity',
  family: 'tamponade',
  level: 'omission',
  title: 'Silicone oil without its viscosity',
  why: 'How soon it emulsifies and how it comes out depend on it.',
  source: { text: 'Silicone oil 1,000, 1,300, 5,000 cSt', certainty: 'M' },
  answerable: true,
  check: (record) =>
    oilOf(record) === 'silicone-oil' && record.tamponade?.viscosityCentistokes === undefined
      ? [
          {
            fields: ['tamponade.viscosityCentistokes'],
            message: 'Silicone oil is left in the eye; its viscosity is not recorded.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'not recorded',
        fields: 'tamponade.viscosityCentistokes',
        record: { tamponade: { agent: 'silicone-oil' } },
      },
    ],
    silent: [{ name: '1,000', record: { tamponade: { agent: 'silicone-oil', viscosityCentistokes: 1000 } } }],
    unknown: [{ name: 'no agent', record: { tamponade: { fillPercent: 90 } } }],
  },
});
