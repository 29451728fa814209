import { defineRule } from '../../define-rule.ts';
import { minutesBetween } from '../../facts.ts';

export const rule = defineRule({
  id: 'time-out-after-start',
  family: 'time',
  level: 'contradiction',
  title: 'The time-out comes after the operation started, or long before it',
  why: 'A time-out that is not right before the incision checks nothing.',
  source: { text: 'Surgical safety practice', certainty: 'P' },
  answerable: false,
  check: ({ who }) => {
    if (who?.timeOutAt === undefined || who.startedAt === undefined) return [];
    const minutes = minutesBetween(who.timeOutAt, who.startedAt);
    if (minutes >= 0 && minutes <= 180) return [];
    const far = minutes < 0 ? `${-minutes} minutes after` : `${minutes} minutes before`;
    return [
      {
        fields: ['who.timeOutAt', 'who.startedAt'],
        message: `The time-out at ${who.timeOutAt.slice(11)} lies ${far} the start at ${who.startedAt.slice(11)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'after the start',
        fields: 'who.timeOutAt',
        record: { who: { timeOutAt: '2026-12-01T10:10', startedAt: '2026-12-01T10:00' } },
      },
    ],
    silent: [
      {
        name: 'five minutes before',
        record: { who: { timeOutAt: '2026-12-01T09:55', startedAt: '2026-12-01T10:00' } },
      },
    ],
    unknown: [{ name: 'no time-out recorded', record: { who: { startedAt: '2026-12-01T10:00' } } }],
  },
});
