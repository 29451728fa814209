import { defineRule } from '../../define-rule.ts';
import { dateWords, daysBetween, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'heavy-liquid-left-long',
  family: 'vitreous',
  level: 'caution',
  title: 'Heavy liquid to stay for more than three weeks',
  why: 'Heavy liquid is toxic to the retina it lies on; it is usually out within two to three weeks.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const on = operatedOn(record);
    const left = record.vitreous?.heavyLiquid;
    const planned = record.vitreous?.heavyLiquidRemovalPlannedOn ?? record.aftercare?.nextOperationOn;
    if (left !== 'left' || on === undefined || planned === undefined) return [];
    const days = daysBetween(on, planned);
    if (days <= 21) return [];
    return [
      {
        fields: ['vitreous.heavyLiquidRemovalPlannedOn'],
        message: `Heavy liquid is left in the eye; its removal is planned for ${dateWords(planned)}, ${days} days after the operation.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'three months',
        fields: 'vitreous.heavyLiquidRemovalPlannedOn',
        record: {
          who: { startedAt: '2026-03-02T09:00' },
          vitreous: { heavyLiquid: 'left', heavyLiquidRemovalPlannedOn: '2026-06-02' },
        },
      },
    ],
    silent: [
      {
        name: 'two weeks',
        record: {
          who: { startedAt: '2026-03-02T09:00' },
          vitreous: { heavyLiquid: 'left', heavyLiquidRemovalPlannedOn: '2026-03-16' },
        },
      },
    ],
    unknown: [
      {
        name: 'no date',
        record: { who: { startedAt: '2026-03-02T09:00' }, vitreous: { heavyLiquid: 'left' } },
      },
    ],
  },
});
