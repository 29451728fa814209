import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-aftercare',
  family: 'standards',
  level: 'omission',
  title: 'The plan after the operation is not complete',
  why: 'The ward, the family doctor and the patient act on it.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: post-operative care',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ aftercare }) => {
    const items = [
      { field: 'aftercare.drops', what: 'drops or none', value: aftercare?.drops },
      {
        field: 'aftercare.reviewAt',
        what: 'the review',
        value: aftercare?.reviewAt ?? aftercare?.reviewInDays,
      },
      { field: 'aftercare.warningSigns', what: 'the warning signs told', value: aftercare?.warningSigns },
    ].filter(({ value }) => value === undefined);
    if (items.length === 0) return [];
    return [
      {
        fields: items.map(({ field }) => field),
        message: `Not recorded: ${listWords(items.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'nothing', fields: 'aftercare.drops', record: {} }],
    silent: [
      { name: 'complete', record: { aftercare: { drops: 'none', reviewInDays: 1, warningSigns: ['pain'] } } },
    ],
    unknown: [],
  },
});
