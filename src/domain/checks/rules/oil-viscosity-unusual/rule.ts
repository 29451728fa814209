import { defineRule } from '../../define-rule.ts';
import { numberIn } from '../../facts.ts';

export const rule = defineRule({
  id: 'oil-viscosity-unusual',
  family: 'tamponade',
  level: 'caution',
  title: 'Silicone oil of an unusual viscosity',
  why: 'A nought too few or too many; how soon it emulsifies depends on it.',
  source: { text: 'Silicone oil 1,000, 1,300, 5,000 cSt', certainty: 'M' },
  answerable: true,
  check: (record) => {
    const viscosity = numberIn(record.tamponade?.viscosityCentistokes);
    if (
      record.tamponade?.agent !== 'silicone-oil' ||
      viscosity === undefined ||
      (viscosity >= 900 && viscosity <= 6000)
    )
      return [];
    return [
      {
        fields: ['tamponade.viscosityCentistokes'],
        message: `Silicone oil of ${viscosity} cSt is recorded; 1000 to 5700 cSt is usual.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '100 cSt',
        fields: 'tamponade.viscosityCentistokes',
        record: { tamponade: { agent: 'silicone-oil', viscosityCentistokes: 100 } },
      },
    ],
    silent: [
      { name: '5,000 cSt', record: { tamponade: { agent: 'silicone-oil', viscosityCentistokes: 5000 } } },
    ],
    unknown: [{ name: 'not recorded', record: { tamponade: { agent: 'silicone-oil' } } }],
  },
});
