import { defineRule } from '../../define-rule.ts';
import { elementsOf, minutesBetween } from '../../facts.ts';

export const rule = defineRule({
  id: 'operation-very-short',
  family: 'time',
  level: 'caution',
  title: 'An operation inside or round the eye in less than ten minutes',
  why: 'Start or end may be a slip; times of the operation are part of the legal record.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: dates and times of surgery', certainty: 'R2' },
  answerable: true,
  unless: ['ends-before-start'],
  check: (record) => {
    const { startedAt, endedAt } = record.who ?? {};
    if (startedAt === undefined || endedAt === undefined) return [];
    const minutes = minutesBetween(startedAt, endedAt);
    if (
      minutes >= 10 ||
      minutes < 1 ||
      (record.vitreous?.vitrectomy !== true && elementsOf(record).length === 0)
    )
      return [];
    return [
      {
        fields: ['who.endedAt', 'who.startedAt'],
        message: `The operation is recorded from ${startedAt.slice(11)} to ${endedAt.slice(11)}, ${minutes} minutes.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'six minutes',
        fields: 'who.endedAt',
        record: {
          who: { startedAt: '2026-03-02T09:00', endedAt: '2026-03-02T09:06' },
          vitreous: { vitrectomy: true },
        },
      },
    ],
    silent: [
      {
        name: 'pneumatic retinopexy in eight minutes',
        record: {
          who: { startedAt: '2026-03-02T09:00', endedAt: '2026-03-02T09:08' },
          vitreous: { vitrectomy: false },
          buckle: { elements: 'none' },
        },
      },
    ],
    unknown: [
      {
        name: 'end not recorded',
        record: { who: { startedAt: '2026-03-02T09:00' }, vitreous: { vitrectomy: true } },
      },
    ],
  },
});
