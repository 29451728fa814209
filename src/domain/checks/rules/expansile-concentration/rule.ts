import { gasFacts } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { longGasOf, numberIn, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'expansile-concentration',
  family: 'tamponade',
  level: 'caution',
  title: 'A concentration at which the gas grows in the eye',
  why: 'A growing bubble raises the pressure in the first days.',
  source: {
    text: 'Isoexpansile: SF6 18–20%, C2F6 16%, C3F8 12–16%; safety alert 2018 and Sci Rep 2020 s41598-020-75493-9',
    certainty: 'R',
  },
  answerable: true,
  unless: ['pure-gas-at-full-fill', 'dilution-wrong'],
  check: (record) => {
    const gas = longGasOf(record);
    const percent = numberIn(record.tamponade?.concentrationPercent);
    const { exchange, mixing, volumeMl } = record.tamponade ?? {};
    if (
      gas === undefined ||
      percent === undefined ||
      mixing === 'pure' ||
      percent >= 99 ||
      exchange === 'injection'
    )
      return [];
    if (volumeMl !== undefined && volumeMl <= 1) return [];
    const { low, high } = gasFacts[gas].isoexpansile;
    if (percent <= high) return [];
    const range = low === high ? `${high}%` : `${low}–${high}%`;
    return [
      {
        fields: ['tamponade.concentrationPercent'],
        message: `${numberWords(percent)}% ${gas} expands in the eye; ${range} does not.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '24% SF6',
        fields: 'tamponade.concentrationPercent',
        record: { tamponade: { agent: 'SF6', concentrationPercent: 24 } },
      },
    ],
    silent: [
      { name: '20% SF6', record: { tamponade: { agent: 'SF6', concentrationPercent: 20 } } },
      {
        name: 'small pure bubble',
        record: { tamponade: { agent: 'SF6', mixing: 'pure', concentrationPercent: 100, volumeMl: 0.5 } },
      },
    ],
    unknown: [{ name: 'no concentration', record: { tamponade: { agent: 'SF6' } } }],
  },
});
