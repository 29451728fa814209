import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'tightened-without-pressure',
  family: 'tension',
  level: 'omission',
  title: 'A tightened element without the pressure while it was set',
  why: 'A band set on a soft eye is left too tight; the pressure then is what tells.',
  source: { text: 'The eye is often raised to about 60 mmHg while the band is adjusted', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { shortenedMm, pressureWhileTensioningMmHg, pressureSetBy } = element;
      if (shortenedMm === undefined || shortenedMm <= 0) return [];
      if (pressureWhileTensioningMmHg !== undefined || pressureSetBy === 'palpation') return [];
      return [
        {
          fields: [`buckle.elements.${index}.pressureWhileTensioningMmHg`],
          message: `${elementName(element, index)} was shortened by ${numberWords(shortenedMm)} mm; no pressure is recorded while it was set.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'shortened by 5 mm',
        fields: 'buckle.elements.0.pressureWhileTensioningMmHg',
        record: { buckle: { elements: [{ role: 'encircling', shortenedMm: 5 }] } },
      },
    ],
    silent: [
      {
        name: 'pressure recorded',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 5, pressureWhileTensioningMmHg: 60 }] },
        },
      },
      {
        name: 'by palpation only',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 5, pressureSetBy: 'palpation' }] },
        },
      },
    ],
    unknown: [
      { name: 'shortening not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } },
    ],
  },
});
