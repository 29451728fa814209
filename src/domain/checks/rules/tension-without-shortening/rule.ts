import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'tension-without-shortening',
  family: 'tension',
  level: 'omission',
  title: 'Pressure while tensioning, and by how much the band was shortened is not recorded',
  why: 'Height, refraction and the risk of ischaemia follow from the shortening.',
  source: { text: 'h = ΔL/2π: IOVS abstract 2357577', certainty: 'R' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { shortenedMm, pressureWhileTensioningMmHg: pressure, pressureSetBy } = element;
      if (
        !isEncircling(element) ||
        shortenedMm !== undefined ||
        (pressure === undefined && pressureSetBy === undefined)
      )
        return [];
      const set =
        pressure === undefined
          ? `judged by ${labelOf('buckle.elements.pressureSetBy', pressureSetBy ?? '')}`
          : `${numberWords(pressure)} mmHg`;
      return [
        {
          fields: [`buckle.elements.${index}.shortenedMm`],
          message: `The pressure while the band was set is recorded (${set}); by how much it was shortened is not.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: '60 mmHg',
        fields: 'buckle.elements.0.shortenedMm',
        record: { buckle: { elements: [{ role: 'encircling', pressureWhileTensioningMmHg: 60 }] } },
      },
    ],
    silent: [
      {
        name: 'laid without tension',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 0, pressureWhileTensioningMmHg: 20 }] },
        },
      },
      {
        name: 'segment',
        record: { buckle: { elements: [{ role: 'segment', pressureWhileTensioningMmHg: 20 }] } },
      },
    ],
    unknown: [{ name: 'neither', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
