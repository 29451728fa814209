import { defineRule } from '../../define-rule.ts';
import { daysBetween, numberIn, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'macula-off-before-symptoms',
  family: 'diagnosis',
  level: 'caution',
  title: 'The macula was off for longer than there were symptoms',
  why: 'One of the two durations may be a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const on = operatedOn(record);
    const since = record.before?.symptomsSince;
    const days = numberIn(record.before?.maculaOffDays);
    if (on === undefined || since === undefined || days === undefined || since > on) return [];
    const symptoms = daysBetween(since, on);
    if (days <= symptoms + 1) return [];
    return [
      {
        fields: ['before.maculaOffDays', 'before.symptomsSince'],
        message: `The macula is recorded as off for ${days} days; symptoms began ${symptoms} days before the operation.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'ten days off, three of symptoms',
        fields: 'before.maculaOffDays',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          before: { symptomsSince: '2026-11-28', maculaOffDays: 10 },
        },
      },
    ],
    silent: [
      {
        name: 'two days off',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          before: { symptomsSince: '2026-11-28', maculaOffDays: 2 },
        },
      },
    ],
    unknown: [
      {
        name: 'no symptoms recorded',
        record: { who: { startedAt: '2026-12-01T10:00' }, before: { maculaOffDays: 10 } },
      },
    ],
  },
});
