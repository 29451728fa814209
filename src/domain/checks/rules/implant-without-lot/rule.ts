import { defineRule } from '../../define-rule.ts';
import { elementsOf, lensImplantOf, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'implant-without-lot',
  family: 'implants',
  level: 'omission',
  title: 'An implant without its lot',
  why: 'A recall can only reach patients whose lots are on record.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: prosthesis with serial numbers',
    certainty: 'R2',
  },
  answerable: true,
  check: (record) => {
    const lens = lensImplantOf(record);
    const fields = [
      ...elementsOf(record).flatMap(({ lot }, index) =>
        lot === undefined ? [`buckle.elements.${index}.lot`] : [],
      ),
      ...(oilOf(record) !== undefined && record.tamponade?.lot === undefined ? ['tamponade.lot'] : []),
      ...(lens !== undefined && lens.lot === undefined ? ['vitreous.lensImplant.lot'] : []),
    ];
    if (fields.length === 0) return [];
    const message =
      fields.length === 1
        ? 'One implant is recorded without its lot.'
        : `${fields.length} implants are recorded without their lots.`;
    return [{ fields, message }];
  },
  examples: {
    fires: [
      {
        name: 'band',
        fields: 'buckle.elements.0.lot',
        record: { buckle: { elements: [{ role: 'encircling' }] } },
      },
    ],
    silent: [
      { name: 'gas is no implant', record: { tamponade: { agent: 'SF6' } } },
      { name: 'lot recorded', record: { buckle: { elements: [{ role: 'encircling', lot: 'D4471' }] } } },
    ],
    unknown: [{ name: 'no elements recorded', record: { buckle: {} } }],
  },
});
