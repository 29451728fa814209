import { defineRule } from '../../define-rule.ts';
import { elementsOf, fixationsOf, isEncircling, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'band-fixed-in-few-quadrants',
  family: 'buckle',
  level: 'caution',
  title: 'An encircling band fixed in fewer than three quadrants',
  why: 'A band that is free over half the eye slides.',
  source: { text: 'Usually one fixation a quadrant', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const held = fixationsOf(element);
      if (!isEncircling(element) || held.length === 0 || held.some(({ quadrant }) => quadrant === undefined))
        return [];
      const quadrants = [...new Set(held.map(({ quadrant }) => quadrant))];
      if (quadrants.length >= 3) return [];
      return [
        {
          fields: [`buckle.elements.${index}.fixation`],
          message: `The band is fixed in ${quadrants.length} of 4 quadrants (${listWords(quadrants.map(String))}).`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'two quadrants',
        fields: 'buckle.elements.0.fixation',
        record: {
          buckle: {
            elements: [
              { role: 'encircling', fixation: [{ quadrant: 'superotemporal' }, { quadrant: 'superonasal' }] },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'four quadrants',
        record: {
          buckle: {
            elements: [
              {
                role: 'encircling',
                fixation: [
                  { quadrant: 'superotemporal' },
                  { quadrant: 'superonasal' },
                  { quadrant: 'inferonasal' },
                  { quadrant: 'inferotemporal' },
                ],
              },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'quadrant not recorded',
        record: { buckle: { elements: [{ role: 'encircling', fixation: [{ kind: 'scleral-tunnel' }] }] } },
      },
    ],
  },
});
