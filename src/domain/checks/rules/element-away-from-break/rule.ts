import { hoursApart, onArc, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, elementsOf, reachOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-away-from-break',
  family: 'buckle',
  level: 'contradiction',
  title: 'An element said to support a break lies at other clock hours',
  why: 'An element that does not reach the break leaves it open.',
  source: { text: 'Geometry', certainty: 'P' },
  answerable: false,
  unless: ['support-misses-break'],
  check: (record) => {
    const elements = elementsOf(record);
    return breaksOf(record).flatMap((found, index) => {
      const { clock, supportedByElements, kind } = found;
      if (clock === undefined || kind === undefined || !Array.isArray(supportedByElements)) return [];
      const reach = (number: number): boolean => {
        const { role, fromClock, toClock, meridianClock } = elements[number - 1] ?? {};
        if (role === 'segment' && fromClock !== undefined && toClock !== undefined) {
          const arc = { from: fromClock, to: toClock };
          return (
            onArc(clock, arc) ||
            Math.min(hoursApart(clock, fromClock), hoursApart(clock, toClock)) <= 0.5 + reachOf(found)
          );
        }
        if (role === 'meridional' && meridianClock !== undefined)
          return hoursApart(clock, meridianClock) <= 1 + reachOf(found);
        return true;
      };
      if (supportedByElements.some(reach)) return [];
      const first = (supportedByElements[0] ?? 1) - 1;
      const { role, fromClock = 12, toClock = 12, meridianClock = 12 } = elements[first] ?? {};
      const lies =
        role === 'segment'
          ? `from ${showClock(fromClock)} to ${showClock(toClock)}`
          : `at ${showClock(meridianClock)}`;
      return [
        {
          fields: [
            `breaks.found.${index}.supportedByElements`,
            `breaks.found.${index}.clock`,
            `buckle.elements.${first}.${role === 'segment' ? 'fromClock' : 'meridianClock'}`,
          ],
          message: `Break ${index + 1} lies at ${showClock(clock)}; element ${first + 1}, said to support it, lies ${lies}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'segment elsewhere',
        fields: 'breaks.found.0.supportedByElements',
        record: {
          breaks: {
            found: [{ kind: 'horseshoe', clock: 5, extentClockHours: 0.5, supportedByElements: [1] }],
          },
          buckle: { elements: [{ role: 'segment', fromClock: 9, toClock: 1 }] },
        },
      },
      {
        name: 'radial element elsewhere',
        fields: 'breaks.found.0.supportedByElements',
        record: {
          breaks: {
            found: [{ kind: 'horseshoe', clock: 5, extentClockHours: 0.5, supportedByElements: [1] }],
          },
          buckle: { elements: [{ role: 'meridional', meridianClock: 11 }] },
        },
      },
    ],
    silent: [
      {
        name: 'on the segment',
        record: {
          breaks: {
            found: [{ kind: 'horseshoe', clock: 11, extentClockHours: 0.5, supportedByElements: [1] }],
          },
          buckle: { elements: [{ role: 'segment', fromClock: 9, toClock: 1 }] },
        },
      },
      {
        name: 'band',
        record: {
          breaks: {
            found: [{ kind: 'horseshoe', clock: 5, extentClockHours: 0.5, supportedByElements: [1] }],
          },
          buckle: { elements: [{ role: 'encircling' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'arc not recorded',
        record: {
          breaks: {
            found: [{ kind: 'horseshoe', clock: 5, extentClockHours: 0.5, supportedByElements: [1] }],
          },
          buckle: { elements: [{ role: 'segment' }] },
        },
      },
    ],
  },
});
