import { defineRule } from '../../define-rule.ts';
import { labelOf, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'agent-exchange-mismatch',
  family: 'tamponade',
  level: 'contradiction',
  title: 'The exchange does not fit the agent',
  why: 'It leaves open what is in the eye.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const { agent, exchange } = record.tamponade ?? {};
    if (agent === undefined || exchange === undefined || agent === 'none') return [];
    const oilExchange = exchange.endsWith('-oil');
    const gasExchange = exchange === 'air-gas' || exchange === 'fluid-air-gas';
    const isOil = oilOf(record) !== undefined;
    if ((isOil && gasExchange) || (!isOil && oilExchange)) {
      return [
        {
          fields: ['tamponade.exchange', 'tamponade.agent'],
          message: `The tamponade is ${labelOf('tamponade.agent', agent)}, put in by ${labelOf('tamponade.exchange', exchange)}.`,
        },
      ];
    }
    return [];
  },
  examples: {
    fires: [
      {
        name: 'gas by an oil exchange',
        fields: 'tamponade.exchange',
        record: { tamponade: { agent: 'SF6', exchange: 'air-oil' } },
      },
    ],
    silent: [{ name: 'gas for air', record: { tamponade: { agent: 'SF6', exchange: 'air-gas' } } }],
    unknown: [{ name: 'exchange not recorded', record: { tamponade: { agent: 'SF6' } } }],
  },
});
