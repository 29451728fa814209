import { defineRule } from '../../define-rule.ts';
import { daysBetween, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'late-review',
  family: 'aftercare',
  level: 'caution',
  title: 'The first review more than two weeks after surgery',
  why: 'Pressure, infection and early redetachment show in the first days.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const on = operatedOn(record);
    const { reviewAt, reviewInDays } = record.aftercare ?? {};
    const days =
      reviewInDays ?? (on !== undefined && reviewAt !== undefined ? daysBetween(on, reviewAt) : undefined);
    if (days === undefined || days <= 15) return [];
    return [
      {
        fields: [reviewInDays === undefined ? 'aftercare.reviewAt' : 'aftercare.reviewInDays'],
        message: `The first review is ${days} days after the operation.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'two months', fields: 'aftercare.reviewInDays', record: { aftercare: { reviewInDays: 60 } } },
    ],
    silent: [{ name: 'tomorrow', record: { aftercare: { reviewInDays: 1 } } }],
    unknown: [{ name: 'not recorded', record: { aftercare: {} } }],
  },
});
