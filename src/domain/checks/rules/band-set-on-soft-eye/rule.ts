import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'band-set-on-soft-eye',
  family: 'tension',
  level: 'caution',
  title: 'A band tightened on a soft eye',
  why: 'A band set on a soft eye is too tight when the pressure comes back.',
  source: { text: 'The eye is often raised to about 60 mmHg while the band is adjusted', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap(({ shortenedMm, pressureWhileTensioningMmHg: pressure }, index) =>
      pressure !== undefined && pressure < 12 && (shortenedMm ?? 0) > 3
        ? [
            {
              fields: [
                `buckle.elements.${index}.pressureWhileTensioningMmHg`,
                `buckle.elements.${index}.shortenedMm`,
              ],
              message: `The band was shortened by ${numberWords(shortenedMm ?? 0)} mm at a pressure of ${numberWords(pressure)} mmHg.`,
            },
          ]
        : [],
    ),
  examples: {
    fires: [
      {
        name: '6 mmHg',
        fields: 'buckle.elements.0.pressureWhileTensioningMmHg',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 8, pressureWhileTensioningMmHg: 6 }] },
        },
      },
    ],
    silent: [
      {
        name: '60 mmHg',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 8, pressureWhileTensioningMmHg: 60 }] },
        },
      },
    ],
    unknown: [
      {
        name: 'shortening not recorded',
        record: { buckle: { elements: [{ role: 'encircling', pressureWhileTensioningMmHg: 6 }] } },
      },
    ],
  },
});
