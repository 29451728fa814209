import { defineRule } from '../../define-rule.ts';
import { dateWords, daysBetween, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'review-dates-differ',
  family: 'time',
  level: 'contradiction',
  title: 'The review has two different dates',
  why: 'The patient can only come on one of them.',
  source: { text: 'Calendar', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const on = operatedOn(record);
    const { reviewAt, reviewInDays } = record.aftercare ?? {};
    if (on === undefined || reviewAt === undefined || reviewInDays === undefined) return [];
    const days = daysBetween(on, reviewAt);
    if (Math.abs(days - reviewInDays) <= 1) return [];
    return [
      {
        fields: ['aftercare.reviewAt', 'aftercare.reviewInDays'],
        message: `The review is dated ${dateWords(reviewAt)}, ${days} days after the operation, and also said to be in ${reviewInDays} days.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'a week apart',
        fields: 'aftercare.reviewAt',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          aftercare: { reviewAt: '2026-12-10T09:00', reviewInDays: 1 },
        },
      },
    ],
    silent: [
      {
        name: 'the same',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          aftercare: { reviewAt: '2026-12-02T09:00', reviewInDays: 1 },
        },
      },
    ],
    unknown: [
      {
        name: 'only one given',
        record: { who: { startedAt: '2026-12-01T10:00' }, aftercare: { reviewInDays: 1 } },
      },
    ],
  },
});
