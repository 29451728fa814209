import { arcHours, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'segment-over-half',
  family: 'buckle',
  level: 'caution',
  title: 'A segment of more than 180°',
  why: 'A segment that long acts like an encircling element without being one.',
  source: { text: 'A segment is usually kept to no more than 180°', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap(({ role, fromClock, toClock }, index) => {
      if (role !== 'segment' || fromClock === undefined || toClock === undefined) return [];
      const hours = arcHours({ from: fromClock, to: toClock });
      if (hours <= 6) return [];
      return [
        {
          fields: [`buckle.elements.${index}.toClock`, `buckle.elements.${index}.fromClock`],
          message: `The segment runs over ${numberWords(hours)} clock hours, from ${showClock(fromClock)} to ${showClock(toClock)}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'nine hours',
        fields: 'buckle.elements.0.toClock',
        record: { buckle: { elements: [{ role: 'segment', fromClock: 10, toClock: 7 }] } },
      },
    ],
    silent: [
      {
        name: 'across 12',
        record: { buckle: { elements: [{ role: 'segment', fromClock: 10, toClock: 2 }] } },
      },
    ],
    unknown: [{ name: 'no arc', record: { buckle: { elements: [{ role: 'segment' }] } } }],
  },
});
