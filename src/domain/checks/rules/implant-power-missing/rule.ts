import { defineRule } from '../../define-rule.ts';
import { lensImplantOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'implant-power-missing',
  family: 'implants',
  level: 'omission',
  title: 'A lens implant without its power',
  why: 'The refraction and the fellow eye’s operation are planned from it.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: prosthesis details',
    certainty: 'R2',
  },
  answerable: true,
  check: (record) => {
    const lens = lensImplantOf(record);
    return lens !== undefined && lens.powerDioptres === undefined
      ? [
          {
            fields: ['vitreous.lensImplant.powerDioptres'],
            message: 'A lens implant is recorded without its power in dioptres.',
          },
        ]
      : [];
  },
  examples: {
    fires: [
      {
        name: 'no power',
        fields: 'vitreous.lensImplant.powerDioptres',
        record: { vitreous: { lensImplant: { form: 'one-piece acrylic' } } },
      },
    ],
    silent: [
      {
        name: '21 D',
        record: { vitreous: { lensImplant: { form: 'one-piece acrylic', powerDioptres: 21 } } },
      },
    ],
    unknown: [{ name: 'no implant', record: { vitreous: { lensImplant: 'not-applicable' } } }],
  },
});
