import { hoursApart, onArc, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { detachedArcOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'drainage-off-the-detachment',
  family: 'drainage',
  level: 'contradiction',
  title: 'Drained from outside where the retina was attached',
  why: 'A puncture under attached retina perforates it; hour or extent is wrong.',
  source: { text: 'Extent in clock hours', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const arc = detachedArcOf(record);
    const { kind, clock } = record.drainage ?? {};
    if (kind !== 'external' || clock === undefined || arc === undefined || arc === 'all' || onArc(clock, arc))
      return [];
    if (Math.min(hoursApart(clock, arc.from), hoursApart(clock, arc.to)) <= 0.5) return [];
    return [
      {
        fields: ['drainage.clock', 'before.detachmentFromClock', 'before.detachmentToClock'],
        message: `Fluid was drained externally at ${showClock(clock)}; the detachment extends from ${showClock(arc.from)} to ${showClock(arc.to)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'under attached retina',
        fields: 'drainage.clock',
        record: {
          before: { detachmentFromClock: 9, detachmentToClock: 2 },
          drainage: { kind: 'external', clock: 6 },
        },
      },
    ],
    silent: [
      {
        name: 'in the detachment',
        record: {
          before: { detachmentFromClock: 9, detachmentToClock: 2 },
          drainage: { kind: 'external', clock: 11 },
        },
      },
      {
        name: 'total',
        record: { before: { totalDetachment: true }, drainage: { kind: 'external', clock: 6 } },
      },
    ],
    unknown: [{ name: 'extent not recorded', record: { drainage: { kind: 'external', clock: 6 } } }],
  },
});
