import { isAbsorbable } from '../../../physics/sutures.ts';
import { defineRule } from '../../define-rule.ts';
import { closureOf, elementsOf, isEncircling, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'temporary-closure-permanent-band',
  family: 'closure',
  level: 'contradiction',
  title: 'A permanent band joined by a suture that is absorbed',
  why: 'The band lets go when the knot does.',
  source: {
    text: 'Polyglactin 910 holds 25% at 4 weeks and none by week 5; polydioxanone 25% at 6 weeks',
    certainty: 'R',
  },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const material = closureOf(element)?.material;
      if (!isEncircling(element) || element.intention !== 'permanent' || material === undefined) return [];
      if (material === 'not-applicable' || !isAbsorbable(material)) return [];
      const name = labelOf('buckle.elements.closure.material', material);
      const message = `The band is intended to be permanent; its ends are joined with ${name}, which is absorbed.`;
      return [
        {
          fields: [`buckle.elements.${index}.closure.material`, `buckle.elements.${index}.intention`],
          message,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'polyglactin knot',
        fields: 'buckle.elements.0.closure.material',
        record: {
          buckle: {
            elements: [
              {
                role: 'encircling',
                intention: 'permanent',
                closure: { kind: 'knot', material: 'polyglactin-910' },
              },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'temporary on purpose',
        record: {
          buckle: {
            elements: [
              {
                role: 'encircling',
                intention: 'temporary',
                closure: { kind: 'knot', material: 'polyglactin-910' },
              },
            ],
          },
        },
      },
      {
        name: 'sleeve',
        record: {
          buckle: {
            elements: [
              {
                role: 'encircling',
                intention: 'permanent',
                closure: { kind: 'sleeve', material: 'silicone' },
              },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'intention not recorded',
        record: {
          buckle: {
            elements: [{ role: 'encircling', closure: { kind: 'knot', material: 'polyglactin-910' } }],
          },
        },
      },
    ],
  },
});
