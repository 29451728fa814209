import { defineRule } from '../../define-rule.ts';
import { closureOf, elementName, elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'closure-material-missing',
  family: 'closure',
  level: 'omission',
  title: 'Ends joined by a suture or knot of which the material is not recorded',
  why: 'Polyglactin is gone by week 5, nylon stays: the one lets the band go, the other does not.',
  source: {
    text: 'Polyglactin 910 none by week 5; polydioxanone 25% at 6 weeks; nylon, polyester lasting',
    certainty: 'R',
  },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { kind, material } = closureOf(element) ?? {};
      if ((kind !== 'suture' && kind !== 'knot') || (material !== undefined && material !== 'not-applicable'))
        return [];
      return [
        {
          fields: [`buckle.elements.${index}.closure.material`],
          message: `The ends of ${elementName(element, index).toLowerCase()} were joined by a ${kind}; of what material is not recorded.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'a knot of nothing',
        fields: 'buckle.elements.0.closure.material',
        record: { buckle: { elements: [{ role: 'encircling', closure: { kind: 'knot' } }] } },
      },
    ],
    silent: [
      {
        name: 'sleeve',
        record: { buckle: { elements: [{ role: 'encircling', closure: { kind: 'sleeve' } }] } },
      },
    ],
    unknown: [{ name: 'join not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
