import { defineRule } from '../../define-rule.ts';
import { elementsOf, fixationsOf, isEncircling } from '../../facts.ts';

export const rule = defineRule({
  id: 'fixation-quadrant-twice',
  family: 'buckle',
  level: 'caution',
  title: 'Four fixations of a band, one quadrant twice and another missing',
  why: 'Usually there is one a quadrant; the quadrant written twice may be the one that is missing.',
  source: { text: 'Fixation, usually one a quadrant', certainty: 'P' },
  answerable: true,
  unless: ['band-fixed-in-few-quadrants'],
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const held = fixationsOf(element).flatMap(({ quadrant }) => (quadrant === undefined ? [] : [quadrant]));
      if (!isEncircling(element) || held.length !== 4 || new Set(held).size !== 3) return [];
      const at = held.findIndex((quadrant, place) => held.indexOf(quadrant) < place);
      const all = ['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'] as const;
      const bare = all.find((quadrant) => !held.includes(quadrant)) ?? '';
      return [
        {
          fields: [`buckle.elements.${index}.fixation.${at}.quadrant`],
          message: `The band is recorded as fixed twice in the ${held[at] ?? ''} quadrant and not in the ${bare} one.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'one twice',
        fields: 'buckle.elements.0.fixation.3.quadrant',
        record: {
          buckle: {
            elements: [
              {
                role: 'encircling',
                fixation: [
                  { quadrant: 'superotemporal' },
                  { quadrant: 'superonasal' },
                  { quadrant: 'inferonasal' },
                  { quadrant: 'superotemporal' },
                ],
              },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'one each',
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
      {
        name: 'tunnels in three quadrants',
        record: {
          buckle: {
            elements: [
              {
                role: 'encircling',
                fixation: [
                  { quadrant: 'superotemporal' },
                  { quadrant: 'superonasal' },
                  { quadrant: 'inferonasal' },
                ],
              },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'a quadrant not recorded',
        record: {
          buckle: {
            elements: [
              {
                role: 'encircling',
                fixation: [
                  { quadrant: 'superotemporal' },
                  { quadrant: 'superonasal' },
                  { quadrant: 'superotemporal' },
                  { kind: 'scleral-tunnel' },
                ],
              },
            ],
          },
        },
      },
    ],
  },
});
