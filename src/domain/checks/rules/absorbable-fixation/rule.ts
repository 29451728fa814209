import { isAbsorbable } from '../../../physics/sutures.ts';
import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, fixationsOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'absorbable-fixation',
  family: 'closure',
  level: 'contradiction',
  title: 'A permanent element held only by sutures that are absorbed',
  why: 'The element is loose before a capsule holds it.',
  source: { text: 'Polyglactin 910: none by week 5; polydioxanone 25% at 6 weeks', certainty: 'R' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const held = fixationsOf(element);
      if (element.intention !== 'permanent' || held.length === 0) return [];
      const absorbed = held.filter(
        ({ kind, material }) =>
          kind === 'mattress-suture' && material !== undefined && isAbsorbable(material),
      );
      if (absorbed.length < held.length) return [];
      const name = labelOf('buckle.elements.fixation.material', absorbed[0]?.material ?? '');
      return [
        {
          fields: [`buckle.elements.${index}.fixation.0.material`, `buckle.elements.${index}.intention`],
          message: `${elementName(element, index)} is intended to be permanent; every suture that holds it is ${name}, which is absorbed.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'polyglactin',
        fields: 'buckle.elements.0.fixation.0.material',
        record: {
          buckle: {
            elements: [
              {
                role: 'segment',
                intention: 'permanent',
                fixation: [{ kind: 'mattress-suture', material: 'polyglactin-910' }],
              },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'nylon',
        record: {
          buckle: {
            elements: [
              {
                role: 'segment',
                intention: 'permanent',
                fixation: [{ kind: 'mattress-suture', material: 'nylon' }],
              },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'material not recorded',
        record: {
          buckle: {
            elements: [{ role: 'segment', intention: 'permanent', fixation: [{ kind: 'mattress-suture' }] }],
          },
        },
      },
    ],
  },
});
