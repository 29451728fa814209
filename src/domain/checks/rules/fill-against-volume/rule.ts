import { globeOf } from '../../../anatomy/globe.ts';
import { cavityMl } from '../../../physics/bubble.ts';
import { gasFacts } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { gasOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'fill-against-volume',
  family: 'tamponade',
  level: 'caution',
  title: 'The fill is far more than the injected volume can give',
  why: 'Posture and the advice on flying follow from how large the bubble is.',
  source: {
    text: 'V = 4/3·πR³ of the cavity; expansion of the pure gases: safety alert 2018',
    certainty: 'C',
  },
  answerable: true,
  check: (record) => {
    const gas = gasOf(record);
    const { exchange, volumeMl, fillPercent } = record.tamponade ?? {};
    if (gas === undefined || exchange !== 'injection' || volumeMl === undefined || fillPercent === undefined)
      return [];
    const cavity = cavityMl(globeOf(record.before?.axialLengthMm).cavityRadiusMm);
    const most = ((volumeMl * gasFacts[gas].expansion) / cavity) * 100;
    if (fillPercent <= most * 1.5 + 10) return [];
    return [
      {
        fields: ['tamponade.fillPercent', 'tamponade.volumeMl'],
        message: `A fill of ${numberWords(fillPercent)}% is recorded; ${numberWords(volumeMl)} mL of ${gas} injected gives at most about ${Math.round(most)}% (an estimate).`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '90% from 0.3 mL',
        fields: 'tamponade.fillPercent',
        record: { tamponade: { agent: 'C3F8', exchange: 'injection', volumeMl: 0.3, fillPercent: 90 } },
      },
    ],
    silent: [
      {
        name: '25% from 0.3 mL',
        record: { tamponade: { agent: 'C3F8', exchange: 'injection', volumeMl: 0.3, fillPercent: 25 } },
      },
    ],
    unknown: [
      {
        name: 'volume not recorded',
        record: { tamponade: { agent: 'C3F8', exchange: 'injection', fillPercent: 90 } },
      },
    ],
  },
});
