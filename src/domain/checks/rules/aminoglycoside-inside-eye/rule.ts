import { defineRule } from '../../define-rule.ts';
import { labelOf, medicinesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'aminoglycoside-inside-eye',
  family: 'medicines',
  level: 'caution',
  title: 'An aminoglycoside given inside the eye',
  why: 'Gentamicin that reaches the retina closes the vessels of the macula.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    medicinesOf(record).flatMap(({ drug = '', route }, index) => {
      if (!/gentamicin|tobramycin|amikacin|neomycin/i.test(drug)) return [];
      if (route !== 'intravitreal' && route !== 'intracameral') return [];
      return [
        {
          fields: [`endOfCase.medicines.${index}.drug`, `endOfCase.medicines.${index}.route`],
          message: `${drug} was given ${labelOf('endOfCase.medicines.route', route)}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'inside',
        fields: 'endOfCase.medicines.0.drug',
        record: { endOfCase: { medicines: [{ drug: 'Gentamicin', route: 'intravitreal' }] } },
      },
    ],
    silent: [
      {
        name: 'under the conjunctiva',
        record: {
          vitreous: { vitrectomy: false },
          endOfCase: { medicines: [{ drug: 'Gentamicin', route: 'subconjunctival' }] },
        },
      },
    ],
    unknown: [{ name: 'route not recorded', record: { endOfCase: { medicines: [{ drug: 'Gentamicin' }] } } }],
  },
});
