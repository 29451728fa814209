import { globeOf } from '../../../anatomy/globe.ts';
import { insertionMm } from '../../../anatomy/insertions.ts';
import { curveLengthMm } from '../../../physics/band.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'band-does-not-fit-globe',
  family: 'buckle',
  level: 'contradiction',
  title: 'The length of the band cannot go round this eye',
  why: 'A band cut to that length would not meet, or was not the length put in.',
  source: { text: 'C(s) = 2πR·sin(θ0 + s/R)', certainty: 'C' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      if (isEncircling(element) && element.lengthMm !== undefined && element.lengthMm < 35) {
        const message = `The band is recorded as ${numberWords(element.lengthMm)} mm long, which goes round no eye.`;
        return [{ fields: [`buckle.elements.${index}.lengthMm`], message }];
      }
      const { lengthMm, shortenedMm, frontEdgeMm, frontEdgeReference } = element;
      const axialLengthMm = record.before?.axialLengthMm;
      if (
        !isEncircling(element) ||
        lengthMm === undefined ||
        frontEdgeMm === undefined ||
        frontEdgeReference === undefined ||
        shortenedMm === undefined ||
        axialLengthMm === undefined
      )
        return [];
      const eye = record.who?.eye ?? 'right';
      const globe = globeOf(axialLengthMm);
      const middle = (clock: number) =>
        (frontEdgeReference === 'insertions' ? insertionMm(clock, eye) : 0) + frontEdgeMm;
      const round = curveLengthMm(globe, middle, { from: 6, to: 6 });
      // The front edge is the shortest way round. Axial length and course are estimates: only what misses by more than a tenth is impossible.
      if (lengthMm >= (round - shortenedMm) * 0.88) return [];
      const message = `The band is ${numberWords(lengthMm)} mm long; round the eye at its place it is about ${Math.round(round)} mm (an estimate), less ${numberWords(shortenedMm)} mm of shortening.`;
      return [
        { fields: [`buckle.elements.${index}.lengthMm`, `buckle.elements.${index}.frontEdgeMm`], message },
      ];
    }),
  examples: {
    fires: [
      {
        name: '12.5 for 125',
        fields: 'buckle.elements.0.lengthMm',
        record: { buckle: { elements: [{ role: 'encircling', lengthMm: 12.5 }] } },
      },
      {
        name: '40 mm',
        fields: 'buckle.elements.0.lengthMm',
        record: {
          before: { axialLengthMm: 24 },
          buckle: {
            elements: [
              {
                role: 'encircling',
                lengthMm: 40,
                frontEdgeMm: 3,
                frontEdgeReference: 'insertions',
                shortenedMm: 0,
              },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: '72 mm',
        record: {
          before: { axialLengthMm: 24 },
          buckle: {
            elements: [
              {
                role: 'encircling',
                lengthMm: 72,
                frontEdgeMm: 3,
                frontEdgeReference: 'insertions',
                shortenedMm: 5,
              },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'place not recorded',
        record: { buckle: { elements: [{ role: 'encircling', lengthMm: 40 }] } },
      },
    ],
  },
});
