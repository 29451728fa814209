import { defineRule } from '../../define-rule.ts';
import { dateWords, daysBetween, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'symptoms-for-years',
  family: 'time',
  level: 'caution',
  title: 'Symptoms for more than two years',
  why: 'A year in the date may be a slip; if not, the detachment is long-standing.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const on = operatedOn(record);
    const since = record.before?.symptomsSince;
    if (on === undefined || since === undefined) return [];
    const days = daysBetween(since, on);
    if (days <= 730) return [];
    return [
      {
        fields: ['before.symptomsSince'],
        message: `Symptoms are recorded since ${dateWords(since)}, ${Math.floor(days / 365)} years before the operation.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'ten years',
        fields: 'before.symptomsSince',
        record: { who: { startedAt: '2026-03-02T09:00' }, before: { symptomsSince: '2016-03-01' } },
      },
    ],
    silent: [
      {
        name: 'five months, an old inferior detachment',
        record: { who: { startedAt: '2026-03-02T09:00' }, before: { symptomsSince: '2025-10-01' } },
      },
    ],
    unknown: [{ name: 'day of surgery not recorded', record: { before: { symptomsSince: '2016-03-01' } } }],
  },
});
