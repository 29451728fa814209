import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'heavy-liquid-use-not-recorded',
  family: 'vitreous',
  level: 'contradiction',
  title: 'Heavy liquid was exchanged or measured, and was not used',
  why: 'Whether heavy liquid may still be in the eye must be certain.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ vitreous, tamponade }) => {
    if (vitreous?.heavyLiquid !== 'none') return [];
    if (tamponade?.exchange === 'heavy-liquid-oil') {
      return [
        {
          fields: ['vitreous.heavyLiquid', 'tamponade.exchange'],
          message: 'Oil was exchanged directly for heavy liquid; heavy liquid is recorded as not used.',
        },
      ];
    }
    if ((vitreous.heavyLiquidVolumeMl ?? 0) > 0) {
      return [
        {
          fields: ['vitreous.heavyLiquid', 'vitreous.heavyLiquidVolumeMl'],
          message: `${vitreous.heavyLiquidVolumeMl} mL of heavy liquid is recorded, and heavy liquid as not used.`,
        },
      ];
    }
    return [];
  },
  examples: {
    fires: [
      {
        name: 'direct exchange',
        fields: 'vitreous.heavyLiquid',
        record: { vitreous: { heavyLiquid: 'none' }, tamponade: { exchange: 'heavy-liquid-oil' } },
      },
    ],
    silent: [
      {
        name: 'used',
        record: { vitreous: { heavyLiquid: 'removed' }, tamponade: { exchange: 'heavy-liquid-oil' } },
      },
    ],
    unknown: [{ name: 'not recorded', record: { tamponade: { exchange: 'heavy-liquid-oil' } } }],
  },
});
