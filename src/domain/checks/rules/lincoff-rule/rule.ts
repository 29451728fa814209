import { arcHours, hoursApart, onArc, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'lincoff-rule',
  family: 'diagnosis',
  level: 'caution',
  title: 'No break where the shape of the detachment points',
  why: 'A missed break is the commonest reason for failure; the border of the fluid tells where to look.',
  source: {
    text: 'Lincoff: upper detachments within 1.5 clock hours of the highest border in 98%, lower on the higher side in 95% (Duane)',
    certainty: 'R',
  },
  answerable: true,
  check: (record) => {
    const {
      detachmentFromClock: from,
      detachmentToClock: to,
      totalDetachment,
      recurrent,
      diagnosis,
    } = record.before ?? {};
    const clocks = breaksOf(record).flatMap(({ clock }) => (clock === undefined ? [] : [clock]));
    if (from === undefined || to === undefined || totalDetachment === true || recurrent === true) return [];
    if (diagnosis !== 'rhegmatogenous' || clocks.length === 0 || clocks.length < breaksOf(record).length)
      return [];
    const arc = { from, to };
    // Fluid that crosses 12 can come from either side, and a break near 12: the rule for one side does not apply.
    if (onArc(12, arc) || arcHours(arc) > 9) return [];
    const height = (clock: number) => hoursApart(clock, 12);
    const highest = height(from) <= height(to) ? from : to;
    const upper = height(highest) < 3;
    const near = clocks.some((clock) =>
      upper ? hoursApart(clock, highest) <= 2 : height(clock) <= height(highest) + 3.5,
    );
    if (near) return [];
    const message = `The fluid reaches highest at ${showClock(highest)}; no break is recorded near there (breaks at ${listWords(clocks.map(showClock))}).`;
    return [{ fields: ['breaks.found', 'before.detachmentFromClock', 'before.detachmentToClock'], message }];
  },
  examples: {
    fires: [
      {
        name: 'break at the low end',
        fields: 'breaks.found',
        record: {
          before: { diagnosis: 'rhegmatogenous', detachmentFromClock: 1, detachmentToClock: 6 },
          breaks: { found: [{ clock: 6 }] },
        },
      },
    ],
    silent: [
      {
        name: 'break at the high border',
        record: {
          before: { diagnosis: 'rhegmatogenous', detachmentFromClock: 1, detachmentToClock: 6 },
          breaks: { found: [{ clock: 1.5 }] },
        },
      },
    ],
    unknown: [
      {
        name: 'clock hour of the break not recorded',
        record: {
          before: { diagnosis: 'rhegmatogenous', detachmentFromClock: 1, detachmentToClock: 6 },
          breaks: { found: [{ kind: 'horseshoe' }] },
        },
      },
    ],
  },
});
