import { defineRule } from '../../define-rule.ts';
import { dateWords, daysBetween, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'follow-up-before-surgery',
  family: 'time',
  level: 'contradiction',
  title: 'Something planned after the operation is dated before its end',
  why: 'The patient would come on the wrong day.',
  source: { text: 'Calendar', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const on = operatedOn(record);
    if (on === undefined) return [];
    const dated = [
      { field: 'aftercare.reviewAt', what: 'The review', date: record.aftercare?.reviewAt },
      {
        field: 'aftercare.nextOperationOn',
        what: 'The next operation',
        date: record.aftercare?.nextOperationOn,
      },
      {
        field: 'vitreous.heavyLiquidRemovalPlannedOn',
        what: 'Removal of the heavy liquid',
        date: record.vitreous?.heavyLiquidRemovalPlannedOn,
      },
    ];
    return dated
      .filter(({ date }) => date !== undefined && daysBetween(on, date) < 0)
      .map(({ field, what, date = '' }) => ({
        fields: [field, 'who.startedAt'],
        message: `${what} is planned for ${dateWords(date)}, before the operation on ${dateWords(on)}.`,
      }));
  },
  examples: {
    fires: [
      {
        name: 'review last month',
        fields: 'aftercare.reviewAt',
        record: { who: { startedAt: '2026-12-01T10:00' }, aftercare: { reviewAt: '2026-11-02T09:00' } },
      },
    ],
    silent: [
      {
        name: 'review tomorrow',
        record: { who: { startedAt: '2026-12-01T10:00' }, aftercare: { reviewAt: '2026-12-02T09:00' } },
      },
    ],
    unknown: [{ name: 'no date of operation', record: { aftercare: { reviewAt: '2026-11-02T09:00' } } }],
  },
});
