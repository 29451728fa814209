import { defineRule } from '../../define-rule.ts';
import { dateWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'referred-before-symptoms',
  family: 'time',
  level: 'caution',
  title: 'Referred before the symptoms began',
  why: 'One of the dates may be a slip; how long there were symptoms is asked in every audit.',
  source: { text: 'Calendar', certainty: 'P' },
  answerable: true,
  check: ({ who, before }) => {
    const referred = who?.referrer?.referredOn;
    const since = before?.symptomsSince;
    if (referred === undefined || since === undefined || referred >= since) return [];
    return [
      {
        fields: ['who.referrer.referredOn', 'before.symptomsSince'],
        message: `The referral is dated ${dateWords(referred)}; symptoms are recorded since ${dateWords(since)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'a week before',
        fields: 'who.referrer.referredOn',
        record: { who: { referrer: { referredOn: '2026-02-20' } }, before: { symptomsSince: '2026-02-27' } },
      },
    ],
    silent: [
      {
        name: 'after',
        record: { who: { referrer: { referredOn: '2026-02-28' } }, before: { symptomsSince: '2026-02-27' } },
      },
    ],
    unknown: [{ name: 'symptoms not dated', record: { who: { referrer: { referredOn: '2026-02-20' } } } }],
  },
});
