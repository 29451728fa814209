import { arcHours, onArc, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'arc-against-role',
  family: 'buckle',
  level: 'contradiction',
  title: 'The place of an element does not go with its role',
  why: 'A band goes all round, a radial element lies on one meridian; the role decides the code and the removal.',
  source: { text: 'Geometry', certainty: 'P' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap(({ role, fromClock, toClock, meridianClock }, index) => {
      const base = `buckle.elements.${index}`;
      if (fromClock !== undefined && toClock !== undefined) {
        const hours = arcHours({ from: fromClock, to: toClock });
        if ((role === 'encircling' && hours < 11) || (role === 'meridional' && hours > 2)) {
          return [
            {
              fields: [`${base}.role`, `${base}.fromClock`, `${base}.toClock`],
              message: `Element ${index + 1} is recorded as ${role === 'encircling' ? 'an' : 'a'} ${labelOf('buckle.elements.role', role)} over ${numberWords(hours)} clock hours, from ${showClock(fromClock)} to ${showClock(toClock)}.`,
            },
          ];
        }
        if (
          role === 'segment' &&
          meridianClock !== undefined &&
          !onArc(meridianClock, { from: fromClock, to: toClock })
        ) {
          return [
            {
              fields: [`${base}.meridianClock`, `${base}.fromClock`, `${base}.toClock`],
              message: `Element ${index + 1} is recorded from ${showClock(fromClock)} to ${showClock(toClock)}, and on the meridian of ${showClock(meridianClock)}.`,
            },
          ];
        }
      }
      return role === 'encircling' && meridianClock !== undefined
        ? [
            {
              fields: [`${base}.role`, `${base}.meridianClock`],
              message: `Element ${index + 1} is recorded as an encircling band and as lying on the meridian of ${showClock(meridianClock)}.`,
            },
          ]
        : [];
    }),
  examples: {
    fires: [
      {
        name: 'a band over five hours',
        fields: 'buckle.elements.0.role',
        record: { buckle: { elements: [{ role: 'encircling', fromClock: 9, toClock: 2 }] } },
      },
      {
        name: 'a radial element over four hours',
        fields: 'buckle.elements.0.role',
        record: { buckle: { elements: [{ role: 'meridional', fromClock: 9, toClock: 1 }] } },
      },
      {
        name: 'a meridian off the segment',
        fields: 'buckle.elements.0.meridianClock',
        record: { buckle: { elements: [{ role: 'segment', fromClock: 9, toClock: 1, meridianClock: 5 }] } },
      },
    ],
    silent: [
      {
        name: 'all round',
        record: { buckle: { elements: [{ role: 'encircling', fromClock: 12, toClock: 12 }] } },
      },
      {
        name: 'on one meridian',
        record: { buckle: { elements: [{ role: 'meridional', meridianClock: 10 }] } },
      },
    ],
    unknown: [
      { name: 'role not recorded', record: { buckle: { elements: [{ fromClock: 9, toClock: 2 }] } } },
    ],
  },
});
