import { percentOf } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { gasOf, numberIn, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'dilution-wrong',
  family: 'tamponade',
  level: 'contradiction',
  title: 'Pure gas, syringe and concentration do not agree',
  why: 'Of 143 confusions four were the wrong gas concentration; one at the wrong strength can close the artery.',
  source: { text: 'Parikh, Ophthalmology 2020;127:296; pure mL = syringe mL × %', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const { pureMl, syringeMl } = record.tamponade ?? {};
    const percent = numberIn(record.tamponade?.concentrationPercent);
    if (
      gasOf(record) === undefined ||
      pureMl === undefined ||
      syringeMl === undefined ||
      percent === undefined ||
      syringeMl === 0
    )
      return [];
    const made = percentOf(pureMl, syringeMl);
    // Filter and tubing make about half a millilitre of difference.
    if (Math.abs(made - percent) <= Math.max(0.6, (0.5 / syringeMl) * 100)) return [];
    const message = `${numberWords(pureMl)} mL in ${numberWords(syringeMl)} mL makes ${numberWords(Math.round(made * 10) / 10)}%; ${numberWords(percent)}% is recorded.`;
    return [
      { fields: ['tamponade.concentrationPercent', 'tamponade.pureMl', 'tamponade.syringeMl'], message },
    ];
  },
  examples: {
    fires: [
      {
        name: '12 mL in 50 mL called 20%',
        fields: 'tamponade.concentrationPercent',
        record: { tamponade: { agent: 'SF6', pureMl: 12, syringeMl: 50, concentrationPercent: 20 } },
      },
    ],
    silent: [
      {
        name: '10 mL in 50 mL',
        record: { tamponade: { agent: 'SF6', pureMl: 10, syringeMl: 50, concentrationPercent: 20 } },
      },
    ],
    unknown: [
      {
        name: 'concentration not recorded',
        record: { tamponade: { agent: 'SF6', pureMl: 12, syringeMl: 50 } },
      },
    ],
  },
});
