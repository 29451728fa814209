import { hoursApart, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, listWords, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'pneumatic-breaks-out-of-reach',
  family: 'breaks',
  level: 'caution',
  title: 'Pneumatic retinopexy for breaks outside the usual limits',
  why: 'The bubble reaches the upper eight hours and about one clock hour between breaks.',
  source: {
    text: 'Breaks within 1 clock hour of each other, between 8 and 4 o’clock through 12',
    certainty: 'R',
  },
  answerable: true,
  check: (record) => {
    if (record.who?.performed?.includes('pneumatic-retinopexy') !== true) return [];
    const clocks = breaksOf(record).flatMap(({ clock, onDetachedRetina }) =>
      clock === undefined || onDetachedRetina === false ? [] : [clock],
    );
    const low = clocks.filter((clock) => hoursApart(clock, 12) > 4);
    const spread = Math.max(0, ...clocks.flatMap((a) => clocks.map((b) => hoursApart(a, b))));
    if (low.length > 0)
      return [
        {
          fields: ['breaks.found'],
          message: `Pneumatic retinopexy with a break at ${listWords(low.map(showClock))}; the usual limits are 8 o’clock and 4 o’clock, through 12 o’clock.`,
        },
      ];
    if (spread > 1.5)
      return [
        {
          fields: ['breaks.found'],
          message: `Pneumatic retinopexy with breaks ${numberWords(spread)} clock hours apart; the usual limit is 1 clock hour.`,
        },
      ];
    return [];
  },
  examples: {
    fires: [
      {
        name: 'break at 6',
        fields: 'breaks.found',
        record: { who: { performed: ['pneumatic-retinopexy'] }, breaks: { found: [{ clock: 6 }] } },
      },
    ],
    silent: [
      {
        name: 'break at 1',
        record: { who: { performed: ['pneumatic-retinopexy'] }, breaks: { found: [{ clock: 1 }] } },
      },
    ],
    unknown: [
      {
        name: 'no clock hour',
        record: { who: { performed: ['pneumatic-retinopexy'] }, breaks: { found: [{ kind: 'horseshoe' }] } },
      },
    ],
  },
});
