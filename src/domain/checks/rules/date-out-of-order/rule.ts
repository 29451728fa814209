import { defineRule } from '../../define-rule.ts';
import { dateWords, operatedOn, previousOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'date-out-of-order',
  family: 'time',
  level: 'contradiction',
  title: 'Something that came before the operation is dated after it',
  why: 'Dates that cannot be make the rest of the note doubtful.',
  source: { text: 'Calendar', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const on = operatedOn(record);
    if (on === undefined) return [];
    const dated = [
      {
        field: 'before.symptomsSince',
        what: 'Symptoms are recorded since',
        date: record.before?.symptomsSince,
      },
      {
        field: 'before.axialLengthMeasuredOn',
        what: 'The axial length was measured on',
        date: record.before?.axialLengthMeasuredOn,
      },
      {
        field: 'who.referrer.referredOn',
        what: 'The referral is dated',
        date: record.who?.referrer?.referredOn,
      },
      ...previousOf(record).map((one, index) => ({
        field: `before.previousOperations.${index}.on`,
        what: 'A previous operation is dated',
        date: one.on,
      })),
    ];
    return dated
      .filter(({ date }) => date !== undefined && date > on)
      .map(({ field, what, date = '' }) => ({
        fields: [field, 'who.startedAt'],
        message: `${what} ${dateWords(date)}; the operation was on ${dateWords(on)}.`,
      }));
  },
  examples: {
    fires: [
      {
        name: 'symptoms after surgery',
        fields: 'before.symptomsSince',
        record: { who: { startedAt: '2026-12-01T10:00' }, before: { symptomsSince: '2026-12-05' } },
      },
    ],
    silent: [
      {
        name: 'symptoms before',
        record: { who: { startedAt: '2026-12-01T10:00' }, before: { symptomsSince: '2026-11-25' } },
      },
    ],
    unknown: [{ name: 'no date of operation', record: { before: { symptomsSince: '2026-12-05' } } }],
  },
});
