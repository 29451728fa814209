import { defineRule } from '../../define-rule.ts';
import { longGasOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'gas-concentration-missing',
  family: 'tamponade',
  level: 'omission',
  title: 'A gas without its concentration',
  why: 'Whoever sees high pressure that night needs to know whether the gas still grows.',
  source: { text: 'Royal College of Ophthalmologists safety alert, 18 December 2018', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const gas = longGasOf(record);
    const { mixing, concentrationPercent } = record.tamponade ?? {};
    if (gas === undefined || mixing === 'pure' || concentrationPercent !== undefined) return [];
    return [
      {
        fields: ['tamponade.concentrationPercent'],
        message: `${gas} is left in the eye; its concentration is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'SF6', fields: 'tamponade.concentrationPercent', record: { tamponade: { agent: 'SF6' } } },
    ],
    silent: [
      { name: 'recorded', record: { tamponade: { agent: 'SF6', concentrationPercent: 20 } } },
      { name: 'pure', record: { tamponade: { agent: 'C3F8', mixing: 'pure' } } },
    ],
    unknown: [{ name: 'agent not recorded', record: { tamponade: { fillPercent: 90 } } }],
  },
});
