import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'heavy-liquid-left',
  family: 'vitreous',
  level: 'omission',
  title: 'Heavy liquid left in the eye without a plan',
  why: 'Heavy liquid is toxic to the retina it lies on.',
  source: {
    text: 'Heavy liquid is taken out before the end; retained in 1–11%, Shulman 2013',
    certainty: 'R',
  },
  answerable: true,
  check: ({ vitreous, aftercare }) => {
    const left = vitreous?.heavyLiquid;
    if (left !== 'left' && left !== 'not-removed') return [];
    if (vitreous?.heavyLiquidRemovalPlannedOn !== undefined || aftercare?.nextOperationOn !== undefined)
      return [];
    return [
      {
        fields: ['vitreous.heavyLiquidRemovalPlannedOn', 'vitreous.heavyLiquid'],
        message: `Heavy liquid: ${labelOf('vitreous.heavyLiquid', left)}; no date for its removal is recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'left',
        fields: 'vitreous.heavyLiquidRemovalPlannedOn',
        record: { vitreous: { heavyLiquid: 'left' } },
      },
    ],
    silent: [
      { name: 'removed', record: { vitreous: { heavyLiquid: 'removed' } } },
      {
        name: 'planned',
        record: { vitreous: { heavyLiquid: 'left', heavyLiquidRemovalPlannedOn: '2026-12-10' } },
      },
    ],
    unknown: [{ name: 'not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
