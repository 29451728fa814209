import { defineRule } from '../../define-rule.ts';
import { elementsOf, gasOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'perfusion-not-recorded',
  family: 'tension',
  level: 'omission',
  title: 'Pressure was raised by an element, gas or oil, and the disc was not said to be perfused',
  why: 'The central retinal artery closed at 48 to 110 mmHg during buckling, exceeded in 13 of 20 eyes.',
  source: { text: 'Gardner, Ophthalmology 1993;100:1050', certainty: 'R' },
  answerable: true,
  check: (record) => {
    if (record.endOfCase?.discPerfused !== undefined) return [];
    const tight = elementsOf(record).find(({ shortenedMm = 0 }) => shortenedMm > 0);
    if (tight !== undefined) {
      return [
        {
          fields: ['endOfCase.discPerfused'],
          message: `An element was shortened by ${numberWords(tight.shortenedMm ?? 0)} mm; whether the disc was perfused is not recorded.`,
        },
      ];
    }
    const injected = record.tamponade?.exchange === 'injection' && gasOf(record) !== undefined;
    return injected
      ? [
          {
            fields: ['endOfCase.discPerfused'],
            message: 'Gas was injected into the closed eye; whether the disc was perfused is not recorded.',
          },
        ]
      : [];
  },
  examples: {
    fires: [
      {
        name: 'tight band',
        fields: 'endOfCase.discPerfused',
        record: { buckle: { elements: [{ role: 'encircling', shortenedMm: 5 }] } },
      },
    ],
    silent: [
      {
        name: 'perfused',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 5 }] },
          endOfCase: { discPerfused: true },
        },
      },
    ],
    unknown: [{ name: 'not tightened', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
