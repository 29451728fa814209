import { arcHours, mayLieIn, showClock, wrapClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, fixationsOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'fixation-off-the-element',
  family: 'buckle',
  level: 'contradiction',
  title: 'A segment fixed in a quadrant where it does not lie',
  why: 'Either the place of the element or the side of the quadrant is wrong.',
  source: { text: 'Temporal is 9 o’clock in a right eye and 3 o’clock in a left', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    if (eye === undefined) return [];
    return elementsOf(record).flatMap((element, index) => {
      const { role, fromClock, toClock, meridianClock } = element;
      const arc =
        role === 'segment' && fromClock !== undefined && toClock !== undefined
          ? { from: fromClock, to: toClock }
          : role === 'meridional' && meridianClock !== undefined
            ? { from: meridianClock, to: wrapClock(meridianClock + 0.01) }
            : undefined;
      if (arc === undefined) return [];
      const half = arcHours(arc) / 2;
      const middle = wrapClock(arc.from + half);
      const off = fixationsOf(element).flatMap(({ quadrant }, at) =>
        quadrant === undefined || mayLieIn(quadrant, middle, half + 0.25, eye) ? [] : [{ at, quadrant }],
      );
      if (off.length === 0) return [];
      const lies =
        role === 'segment'
          ? `from ${showClock(arc.from)} to ${showClock(arc.to)}`
          : `at ${showClock(arc.from)}`;
      return [
        {
          fields: [...off.map(({ at }) => `buckle.elements.${index}.fixation.${at}.quadrant`), 'who.eye'],
          message: `Element ${index + 1} lies ${lies} in the ${eye} eye, and is recorded as fixed in the ${listWords([...new Set(off.map(({ quadrant }) => quadrant))])} quadrant.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'other side',
        fields: 'buckle.elements.0.fixation.0.quadrant',
        record: {
          who: { eye: 'right' },
          buckle: {
            elements: [
              { role: 'segment', fromClock: 8, toClock: 11, fixation: [{ quadrant: 'superonasal' }] },
            ],
          },
        },
      },
      {
        name: 'radial element',
        fields: 'buckle.elements.0.fixation.0.quadrant',
        record: {
          who: { eye: 'left' },
          buckle: {
            elements: [{ role: 'meridional', meridianClock: 1.5, fixation: [{ quadrant: 'superonasal' }] }],
          },
        },
      },
    ],
    silent: [
      {
        name: 'where it lies',
        record: {
          who: { eye: 'right' },
          buckle: {
            elements: [
              { role: 'segment', fromClock: 9, toClock: 12, fixation: [{ quadrant: 'superotemporal' }] },
            ],
          },
        },
      },
      {
        name: 'at the border',
        record: {
          who: { eye: 'right' },
          buckle: {
            elements: [
              { role: 'segment', fromClock: 9, toClock: 12.5, fixation: [{ quadrant: 'superonasal' }] },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'eye not recorded',
        record: {
          buckle: {
            elements: [
              { role: 'segment', fromClock: 9, toClock: 12, fixation: [{ quadrant: 'superonasal' }] },
            ],
          },
        },
      },
    ],
  },
});
