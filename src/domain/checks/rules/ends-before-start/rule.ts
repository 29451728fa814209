import { defineRule } from '../../define-rule.ts';
import { dateWords, minutesBetween } from '../../facts.ts';

export const rule = defineRule({
  id: 'ends-before-start',
  family: 'time',
  level: 'contradiction',
  title: 'The operation ends before it starts',
  why: 'Times of the operation are part of the legal record.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: dates and times of surgery', certainty: 'R2' },
  answerable: false,
  check: ({ who }) => {
    if (who?.startedAt === undefined || who.endedAt === undefined) return [];
    const minutes = minutesBetween(who.startedAt, who.endedAt);
    if (minutes >= 1 && minutes <= 12 * 60) return [];
    const when = (at: string) => `${dateWords(at)} ${at.slice(11)}`;
    const message =
      minutes < 1
        ? `The end, ${when(who.endedAt)}, is not after the start, ${when(who.startedAt)}.`
        : `The operation would have taken ${Math.floor(minutes / 60)} hours, from ${when(who.startedAt)} to ${when(who.endedAt)}.`;
    return [{ fields: ['who.endedAt', 'who.startedAt'], message }];
  },
  examples: {
    fires: [
      {
        name: 'end before start',
        fields: 'who.endedAt',
        record: { who: { startedAt: '2026-12-01T10:00', endedAt: '2026-12-01T09:00' } },
      },
      {
        name: 'a day too late',
        fields: 'who.endedAt',
        record: { who: { startedAt: '2026-12-01T10:00', endedAt: '2026-12-02T11:00' } },
      },
    ],
    silent: [
      { name: 'an hour', record: { who: { startedAt: '2026-12-01T10:00', endedAt: '2026-12-01T11:00' } } },
      {
        name: 'over midnight',
        record: { who: { startedAt: '2026-12-01T23:30', endedAt: '2026-12-02T00:40' } },
      },
    ],
    unknown: [{ name: 'no end yet', record: { who: { startedAt: '2026-12-01T10:00' } } }],
  },
});
