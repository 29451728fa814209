import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'muscles-against-band',
  family: 'buckle',
  level: 'contradiction',
  title: 'An encircling band that does not run under all four recti',
  why: 'A band over a muscle strangles it, and a band round the eye passes all four.',
  source: { text: 'Geometry', certainty: 'P' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const under = element.underMuscles;
      if (!isEncircling(element) || under === undefined || under.length === 0 || under.length === 4)
        return [];
      const names = listWords(under.map((one) => labelOf('buckle.elements.underMuscles', one)));
      return [
        {
          fields: [`buckle.elements.${index}.underMuscles`, `buckle.elements.${index}.role`],
          message: `The band goes round the eye and is recorded under ${under.length} of 4 recti: ${names}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'three of four',
        fields: 'buckle.elements.0.underMuscles',
        record: {
          buckle: { elements: [{ role: 'encircling', underMuscles: ['medial', 'superior', 'lateral'] }] },
        },
      },
    ],
    silent: [
      {
        name: 'all four',
        record: {
          buckle: {
            elements: [{ role: 'encircling', underMuscles: ['medial', 'superior', 'lateral', 'inferior'] }],
          },
        },
      },
    ],
    unknown: [{ name: 'not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
