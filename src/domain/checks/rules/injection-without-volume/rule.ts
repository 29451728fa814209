import { defineRule } from '../../define-rule.ts';
import { capital, gasOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'injection-without-volume',
  family: 'tamponade',
  level: 'omission',
  title: 'Gas injected into a closed eye without the volume',
  why: 'Whoever sees high pressure that night needs to know how much went in.',
  source: { text: 'SF6 0.5 mL, C3F8 0.3 mL, air 0.5–1.0 mL pure', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const { exchange, volumeMl, agent } = record.tamponade ?? {};
    if (
      gasOf(record) === undefined ||
      agent === undefined ||
      exchange !== 'injection' ||
      volumeMl !== undefined
    )
      return [];
    return [
      {
        fields: ['tamponade.volumeMl'],
        message: `${capital(labelOf('tamponade.agent', agent))} is recorded as injected; how much is not.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'how much',
        fields: 'tamponade.volumeMl',
        record: { tamponade: { agent: 'SF6', exchange: 'injection' } },
      },
    ],
    silent: [
      {
        name: 'half a millilitre',
        record: { tamponade: { agent: 'SF6', exchange: 'injection', volumeMl: 0.5 } },
      },
      { name: 'exchanged', record: { tamponade: { agent: 'SF6', exchange: 'air-gas' } } },
    ],
    unknown: [{ name: 'way not recorded', record: { tamponade: { agent: 'SF6' } } }],
  },
});
