import { heightFromShortening } from '../../../physics/band.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'shortened-too-much',
  family: 'tension',
  level: 'caution',
  title: 'A band shortened by more than 12.5 mm',
  why: 'That much would indent the eye by 2 mm all round, with a risk of ischaemia and intrusion.',
  source: { text: '12.57 mm of shortening is 2.00 mm of height', certainty: 'C' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { shortenedMm } = element;
      if (!isEncircling(element) || shortenedMm === undefined || shortenedMm <= 12.57) return [];
      const height = numberWords(Math.round(heightFromShortening(shortenedMm) * 10) / 10);
      return [
        {
          fields: [`buckle.elements.${index}.shortenedMm`],
          message: `The band was shortened by ${numberWords(shortenedMm)} mm, up to about ${height} mm of height all round (an estimate).`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: '18 mm',
        fields: 'buckle.elements.0.shortenedMm',
        record: { buckle: { elements: [{ role: 'encircling', shortenedMm: 18 }] } },
      },
    ],
    silent: [{ name: '10 mm', record: { buckle: { elements: [{ role: 'encircling', shortenedMm: 10 }] } } }],
    unknown: [{ name: 'not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
