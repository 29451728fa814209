import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, isEncircling, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'height-unusual',
  family: 'buckle',
  level: 'caution',
  title: 'A buckle of unusual height',
  why: 'A high buckle presses on the choroid and can intrude; a decimal point may be missing.',
  source: { text: '12.57 mm of shortening is 2.00 mm of height', certainty: 'C' },
  answerable: true,
  unless: ['height-above-bound'],
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { heightMm } = element;
      if (heightMm === undefined || heightMm <= (isEncircling(element) ? 3.5 : 5)) return [];
      return [
        {
          fields: [`buckle.elements.${index}.heightMm`],
          message: `${elementName(element, index)} is recorded with a height of ${numberWords(heightMm)} mm.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: '8 mm',
        fields: 'buckle.elements.0.heightMm',
        record: { buckle: { elements: [{ role: 'segment', heightMm: 8 }] } },
      },
    ],
    silent: [{ name: '2 mm', record: { buckle: { elements: [{ role: 'encircling', heightMm: 2 }] } } }],
    unknown: [{ name: 'not recorded', record: { buckle: { elements: [{ role: 'segment' }] } } }],
  },
});
