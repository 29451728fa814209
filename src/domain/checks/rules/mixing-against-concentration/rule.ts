import { defineRule } from '../../define-rule.ts';
import { gasOf, labelOf, numberIn, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'mixing-against-concentration',
  family: 'tamponade',
  level: 'contradiction',
  title: 'Pure gas at less than 100%, or diluted at 100%, or more gas than the syringe holds',
  why: 'Pure and diluted gas differ fourfold in what they become in the eye.',
  source: { text: 'Royal College of Ophthalmologists safety alert, 18 December 2018', certainty: 'R' },
  answerable: false,
  unless: ['dilution-wrong'],
  check: (record) => {
    const { mixing, pureMl, syringeMl, agent } = record.tamponade ?? {};
    const percent = numberIn(record.tamponade?.concentrationPercent);
    const gas = gasOf(record);
    if (gas === undefined || agent === undefined) return [];
    const name = gas === 'air' ? 'Air' : gas;
    if (pureMl !== undefined && syringeMl !== undefined && pureMl > syringeMl) {
      return [
        {
          fields: ['tamponade.pureMl', 'tamponade.syringeMl'],
          message: `${numberWords(pureMl)} mL of pure ${gas} is recorded in a syringe of ${numberWords(syringeMl)} mL.`,
        },
      ];
    }
    if (percent === undefined) return [];
    const wrong =
      (mixing === 'pure' && percent < 99) ||
      (mixing === 'diluted' && percent >= 99 && gas !== 'air') ||
      (gas === 'air' && percent > 0 && percent < 99);
    if (!wrong) return [];
    return [
      {
        fields: ['tamponade.concentrationPercent', gas === 'air' ? 'tamponade.agent' : 'tamponade.mixing'],
        message: `${name} is recorded ${mixing === undefined ? '' : `as ${labelOf('tamponade.mixing', mixing)} and `}at ${numberWords(percent)}%.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'pure at 20%',
        fields: 'tamponade.concentrationPercent',
        record: { tamponade: { agent: 'SF6', mixing: 'pure', concentrationPercent: 20 } },
      },
      {
        name: 'diluted at 100%',
        fields: 'tamponade.concentrationPercent',
        record: { tamponade: { agent: 'C3F8', mixing: 'diluted', concentrationPercent: 100 } },
      },
      {
        name: 'air at 20%',
        fields: 'tamponade.concentrationPercent',
        record: { tamponade: { agent: 'air', concentrationPercent: 20 } },
      },
      {
        name: 'more than the syringe',
        fields: 'tamponade.pureMl',
        record: { tamponade: { agent: 'SF6', pureMl: 50, syringeMl: 10 } },
      },
    ],
    silent: [
      {
        name: 'diluted',
        record: {
          tamponade: { agent: 'SF6', mixing: 'diluted', concentrationPercent: 20, pureMl: 10, syringeMl: 50 },
        },
      },
      { name: 'air', record: { tamponade: { agent: 'air', concentrationPercent: 'not-applicable' } } },
    ],
    unknown: [
      { name: 'agent not recorded', record: { tamponade: { mixing: 'pure', concentrationPercent: 20 } } },
    ],
  },
});
