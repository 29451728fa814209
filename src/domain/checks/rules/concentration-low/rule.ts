import { gasFacts } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { longGasOf, numberIn, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'concentration-low',
  family: 'tamponade',
  level: 'caution',
  title: 'A gas far below the concentration at which it keeps its volume',
  why: 'It shrinks within hours; the concentration of another gas may have been written.',
  source: { text: 'Isoexpansile: SF6 18–20%, C2F6 16%, C3F8 12–16%; safety alert 2018', certainty: 'R' },
  answerable: true,
  unless: ['dilution-wrong', 'mixing-against-concentration'],
  check: (record) => {
    const gas = longGasOf(record);
    const percent = numberIn(record.tamponade?.concentrationPercent);
    if (gas === undefined || percent === undefined || percent === 0) return [];
    const least = gas === 'SF6' ? 15 : gas === 'C2F6' ? 12 : 8;
    if (percent >= least) return [];
    const { low, high } = gasFacts[gas].isoexpansile;
    return [
      {
        fields: ['tamponade.concentrationPercent'],
        message: `${gas} is recorded at ${numberWords(percent)}%; it keeps its volume at ${low === high ? `${high}%` : `${low}–${high}%`}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'SF6 at 12%',
        fields: 'tamponade.concentrationPercent',
        record: { tamponade: { agent: 'SF6', concentrationPercent: 12 } },
      },
    ],
    silent: [
      { name: 'C3F8 at 12%', record: { tamponade: { agent: 'C3F8', concentrationPercent: 12 } } },
      { name: 'SF6 at 18%', record: { tamponade: { agent: 'SF6', concentrationPercent: 18 } } },
    ],
    unknown: [{ name: 'not recorded', record: { tamponade: { agent: 'SF6' } } }],
  },
});
