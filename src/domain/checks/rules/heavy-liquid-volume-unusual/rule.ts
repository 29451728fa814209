import { globeOf } from '../../../anatomy/globe.ts';
import { cavityMl } from '../../../physics/bubble.ts';
import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'heavy-liquid-volume-unusual',
  family: 'vitreous',
  level: 'caution',
  title: 'More heavy liquid than an eye holds',
  why: 'A decimal point may be missing; what went in has to come out.',
  source: { text: 'V = 4/3·πR³ of the cavity', certainty: 'C' },
  answerable: true,
  check: (record) => {
    const volume = record.vitreous?.heavyLiquidVolumeMl;
    if (volume === undefined) return [];
    const holds = cavityMl(globeOf(record.before?.axialLengthMm ?? 28).cavityRadiusMm);
    if (volume <= Math.max(6, holds * 1.5)) return [];
    return [
      {
        fields: ['vitreous.heavyLiquidVolumeMl'],
        message: `${numberWords(volume)} mL of heavy liquid is recorded; the cavity holds about ${Math.round(holds)} mL (an estimate).`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '18 mL',
        fields: 'vitreous.heavyLiquidVolumeMl',
        record: { before: { axialLengthMm: 24 }, vitreous: { heavyLiquidVolumeMl: 18 } },
      },
    ],
    silent: [
      { name: '3 mL', record: { before: { axialLengthMm: 24 }, vitreous: { heavyLiquidVolumeMl: 3 } } },
    ],
    unknown: [{ name: 'volume not recorded', record: { vitreous: { heavyLiquid: 'removed' } } }],
  },
});
