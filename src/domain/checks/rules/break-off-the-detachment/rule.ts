import { hoursApart, onArc, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, detachedArcOf, reachOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-off-the-detachment',
  family: 'breaks',
  level: 'contradiction',
  title: 'A break said to lie on detached retina lies where the retina is attached, or the other way round',
  why: 'Break and extent cannot both be right, and drainage, laser and posture follow from them.',
  source: { text: 'Extent in clock hours', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const arc = detachedArcOf(record);
    const { recurrent, previousOperations, diagnosis } = record.before ?? {};
    if (arc === undefined || arc === 'all') return [];
    const { from, to } = arc;
    // An older buckle, laser or scar holds retina flat inside a detachment.
    const untouched = recurrent === false && previousOperations === 'none' && diagnosis === 'rhegmatogenous';
    return breaksOf(record).flatMap((found, index) => {
      const { clock, kind, onDetachedRetina, extentClockHours } = found;
      if (
        clock === undefined ||
        kind === undefined ||
        kind === 'macular-hole' ||
        onDetachedRetina === undefined
      )
        return [];
      const half = reachOf(found);
      const inside = onArc(clock, arc);
      const depth = Math.min(hoursApart(clock, from), hoursApart(clock, to));
      const outside = onDetachedRetina && !inside && depth > half + 0.5;
      const within =
        !onDetachedRetina && untouched && extentClockHours !== undefined && inside && depth > half + 1;
      if (!outside && !within) return [];
      return [
        {
          fields: [
            `breaks.found.${index}.onDetachedRetina`,
            `breaks.found.${index}.clock`,
            'before.detachmentFromClock',
          ],
          message: `Break ${index + 1} at ${showClock(clock)} is recorded as on ${outside ? 'detached' : 'attached'} retina; the detachment extends from ${showClock(from)} to ${showClock(to)}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'outside',
        fields: 'breaks.found.0.onDetachedRetina',
        record: {
          before: { detachmentFromClock: 10, detachmentToClock: 2 },
          breaks: { found: [{ kind: 'horseshoe', clock: 6, extentClockHours: 0.5, onDetachedRetina: true }] },
        },
      },
      {
        name: 'well inside',
        fields: 'breaks.found.0.onDetachedRetina',
        record: {
          before: {
            diagnosis: 'rhegmatogenous',
            recurrent: false,
            previousOperations: 'none',
            detachmentFromClock: 9,
            detachmentToClock: 3,
          },
          breaks: {
            found: [{ kind: 'horseshoe', clock: 12, extentClockHours: 0.5, onDetachedRetina: false }],
          },
        },
      },
    ],
    silent: [
      {
        name: 'second break in attached retina',
        record: {
          before: {
            diagnosis: 'rhegmatogenous',
            recurrent: false,
            previousOperations: 'none',
            detachmentFromClock: 10,
            detachmentToClock: 2,
          },
          breaks: {
            found: [{ kind: 'round-hole', clock: 6, extentClockHours: 0.25, onDetachedRetina: false }],
          },
        },
      },
      {
        name: 'held flat by an older buckle',
        record: {
          before: {
            diagnosis: 'rhegmatogenous',
            recurrent: true,
            detachmentFromClock: 9,
            detachmentToClock: 3,
          },
          breaks: {
            found: [{ kind: 'horseshoe', clock: 12, extentClockHours: 0.5, onDetachedRetina: false }],
          },
        },
      },
      {
        name: 'at the border',
        record: {
          before: { detachmentFromClock: 10, detachmentToClock: 2 },
          breaks: {
            found: [{ kind: 'horseshoe', clock: 2.5, extentClockHours: 0.5, onDetachedRetina: true }],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'extent not recorded',
        record: { breaks: { found: [{ kind: 'horseshoe', clock: 6, onDetachedRetina: true }] } },
      },
    ],
  },
});
