import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'time-out-not-timed',
  family: 'time',
  level: 'omission',
  title: 'A time-out without its time',
  why: 'Only a time shows that it came before the incision.',
  source: { text: 'Surgical safety practice', certainty: 'P' },
  answerable: true,
  check: ({ who }) =>
    who?.timeOutEye !== undefined && who.startedAt !== undefined && who.timeOutAt === undefined
      ? [
          {
            fields: ['who.timeOutAt'],
            message: `The ${who.timeOutEye} eye was read out at the time-out; its time is not recorded.`,
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'not timed',
        fields: 'who.timeOutAt',
        record: { who: { timeOutEye: 'left', startedAt: '2026-03-02T09:00' } },
      },
    ],
    silent: [
      {
        name: 'timed',
        record: { who: { timeOutEye: 'left', startedAt: '2026-03-02T09:00', timeOutAt: '2026-03-02T08:55' } },
      },
    ],
    unknown: [{ name: 'no time-out recorded', record: { who: { startedAt: '2026-03-02T09:00' } } }],
  },
});
