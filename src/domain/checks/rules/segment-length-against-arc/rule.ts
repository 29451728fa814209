import { arcHours, showClock } from '../../../anatomy/clock.ts';
import { globeOf } from '../../../anatomy/globe.ts';
import { hourMm } from '../../../anatomy/surface.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'segment-length-against-arc',
  family: 'buckle',
  level: 'contradiction',
  title: 'The length of a segment and its clock hours do not agree',
  why: 'A wrong length or a wrong hour: one tells what is in the eye, the other where.',
  source: { text: 'C(s) = 2πR·sin(θ0 + s/R), a twelfth for each clock hour', certainty: 'C' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap(({ role, lengthMm, fromClock, toClock }, index) => {
      if (role !== 'segment' || lengthMm === undefined || fromClock === undefined || toClock === undefined)
        return [];
      const axial = record.before?.axialLengthMm;
      const hours = arcHours({ from: fromClock, to: toClock });
      // Anywhere from the insertions to behind the equator, in any eye where its length is not known.
      const least = hours * hourMm(globeOf(Math.max(axial ?? 20, 20)), 6) * 0.7 - 1;
      const most = hours * hourMm(globeOf(Math.min(axial ?? 34, 34)), 12) * 1.35 + 2;
      if (lengthMm >= least && lengthMm <= most) return [];
      return [
        {
          fields: [
            `buckle.elements.${index}.lengthMm`,
            `buckle.elements.${index}.fromClock`,
            `buckle.elements.${index}.toClock`,
          ],
          message: `Element ${index + 1} is ${numberWords(lengthMm)} mm long and runs from ${showClock(fromClock)} to ${showClock(toClock)}, which is about ${Math.round(hours * hourMm(globeOf(axial), 10))} mm (an estimate).`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'a point too many',
        fields: 'buckle.elements.0.lengthMm',
        record: {
          before: { axialLengthMm: 24 },
          buckle: { elements: [{ role: 'segment', lengthMm: 2, fromClock: 9, toClock: 1 }] },
        },
      },
    ],
    silent: [
      {
        name: 'as it lies',
        record: {
          before: { axialLengthMm: 24 },
          buckle: { elements: [{ role: 'segment', lengthMm: 25, fromClock: 9, toClock: 1 }] },
        },
      },
    ],
    unknown: [
      {
        name: 'arc not recorded',
        record: { buckle: { elements: [{ role: 'segment', lengthMm: 2, fromClock: 9 }] } },
      },
    ],
  },
});
