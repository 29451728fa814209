import { defineRule } from '../../define-rule.ts';
import { dateWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'review-before-end',
  family: 'time',
  level: 'contradiction',
  title: 'The review is due before the operation was over',
  why: 'The patient would come at the wrong time.',
  source: { text: 'Calendar', certainty: 'P' },
  answerable: false,
  unless: ['follow-up-before-surgery', 'ends-before-start'],
  check: ({ who, aftercare }) => {
    const review = aftercare?.reviewAt;
    const end = who?.endedAt;
    if (review === undefined || end === undefined || review > end) return [];
    return [
      {
        fields: ['aftercare.reviewAt', 'who.endedAt'],
        message: `The review is planned for ${review.slice(11)} on ${dateWords(review)}; the operation ended at ${end.slice(11)} on ${dateWords(end)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'the same morning',
        fields: 'aftercare.reviewAt',
        record: { who: { endedAt: '2026-03-02T10:40' }, aftercare: { reviewAt: '2026-03-02T09:00' } },
      },
    ],
    silent: [
      {
        name: 'the next day',
        record: { who: { endedAt: '2026-03-02T10:40' }, aftercare: { reviewAt: '2026-03-03T09:00' } },
      },
    ],
    unknown: [{ name: 'end not recorded', record: { aftercare: { reviewAt: '2026-03-02T09:00' } } }],
  },
});
