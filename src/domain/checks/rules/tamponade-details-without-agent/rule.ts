import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords, numberIn, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'tamponade-details-without-agent',
  family: 'tamponade',
  level: 'contradiction',
  title: 'No tamponade, and details of one; or details of another agent',
  why: 'One of the two is a slip, and advice on flying and anaesthesia hangs on it.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const { agent, fillPercent, volumeMl } = record.tamponade ?? {};
    if (agent === undefined) return [];
    const percent = numberIn(record.tamponade?.concentrationPercent);
    const viscosity = numberIn(record.tamponade?.viscosityCentistokes);
    const wrong = [
      agent === 'none' && (fillPercent ?? 0) > 0
        ? { field: 'tamponade.fillPercent', what: `a fill of ${fillPercent}%` }
        : undefined,
      agent === 'none' && (volumeMl ?? 0) > 0
        ? { field: 'tamponade.volumeMl', what: `${volumeMl} mL put in` }
        : undefined,
      (agent === 'none' || oilOf(record) !== undefined) && (percent ?? 0) > 0
        ? { field: 'tamponade.concentrationPercent', what: `a gas concentration of ${percent}%` }
        : undefined,
      oilOf(record) === undefined && (viscosity ?? 0) > 0
        ? { field: 'tamponade.viscosityCentistokes', what: `an oil viscosity of ${viscosity} cSt` }
        : undefined,
    ].filter((one) => one !== undefined);
    if (wrong.length === 0) return [];
    const name =
      agent === 'none'
        ? 'No tamponade'
        : labelOf('tamponade.agent', agent).replace(/^./, (c) => c.toUpperCase());
    const message = `${name} is recorded, with ${listWords(wrong.map(({ what }) => what))}.`;
    return [{ fields: ['tamponade.agent', ...wrong.map(({ field }) => field)], message }];
  },
  examples: {
    fires: [
      {
        name: 'none, 90%',
        fields: 'tamponade.agent',
        record: { tamponade: { agent: 'none', fillPercent: 90 } },
      },
      {
        name: 'gas with a viscosity',
        fields: 'tamponade.agent',
        record: { tamponade: { agent: 'SF6', viscosityCentistokes: 1000 } },
      },
    ],
    silent: [
      {
        name: 'oil',
        record: {
          tamponade: {
            agent: 'silicone-oil',
            viscosityCentistokes: 1000,
            concentrationPercent: 'not-applicable',
          },
        },
      },
    ],
    unknown: [{ name: 'agent not recorded', record: { tamponade: { fillPercent: 90 } } }],
  },
});
