import { defineRule } from '../../define-rule.ts';
import { closureOf, elementsOf, isEncircling } from '../../facts.ts';

export const rule = defineRule({
  id: 'band-without-closure',
  family: 'closure',
  level: 'omission',
  title: 'An encircling band without how its ends were joined',
  why: 'The join decides whether the band lasts and where to release it.',
  source: { text: 'Ends joined by silicone sleeve, clip, suture or a knot', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      if (
        !isEncircling(element) ||
        element.closure === 'not-applicable' ||
        closureOf(element)?.kind !== undefined
      )
        return [];
      return [
        {
          fields: [`buckle.elements.${index}.closure.kind`],
          message: 'The band goes round the eye; how its ends were joined is not recorded.',
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'no closure',
        fields: 'buckle.elements.0.closure.kind',
        record: { buckle: { elements: [{ role: 'encircling' }] } },
      },
    ],
    silent: [
      {
        name: 'sleeve',
        record: { buckle: { elements: [{ role: 'encircling', closure: { kind: 'sleeve' } }] } },
      },
    ],
    unknown: [{ name: 'role not recorded', record: { buckle: { elements: [{ widthMm: 2.5 }] } } }],
  },
});
