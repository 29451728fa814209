import { defineRule } from '../../define-rule.ts';
import { gasOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'injection-large',
  family: 'tamponade',
  level: 'caution',
  title: 'A large volume injected into a closed eye',
  why: 'An eye that is not vitrectomized takes about half a millilitre before the artery closes.',
  source: { text: 'SF6 0.5 mL, C3F8 0.3 mL, air 0.5–1.0 mL pure', certainty: 'R' },
  answerable: true,
  unless: ['pneumatic-volume', 'pure-gas-at-full-fill'],
  check: (record) => {
    const { exchange, volumeMl, agent } = record.tamponade ?? {};
    const gas = gasOf(record);
    if (
      gas === undefined ||
      agent === undefined ||
      exchange !== 'injection' ||
      volumeMl === undefined ||
      record.vitreous?.vitrectomy !== false
    )
      return [];
    if (volumeMl <= (gas === 'air' ? 3 : 1.2)) return [];
    return [
      {
        fields: ['tamponade.volumeMl', 'tamponade.exchange'],
        message: `${numberWords(volumeMl)} mL of ${labelOf('tamponade.agent', agent)} is recorded as injected, without vitrectomy.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '4 mL of SF6',
        fields: 'tamponade.volumeMl',
        record: {
          vitreous: { vitrectomy: false },
          tamponade: { agent: 'SF6', exchange: 'injection', volumeMl: 4 },
        },
      },
    ],
    silent: [
      {
        name: 'half a millilitre',
        record: {
          vitreous: { vitrectomy: false },
          tamponade: { agent: 'SF6', exchange: 'injection', volumeMl: 0.5 },
        },
      },
      {
        name: 'air for the fluid drained',
        record: {
          vitreous: { vitrectomy: false },
          tamponade: { agent: 'air', exchange: 'injection', volumeMl: 2 },
        },
      },
    ],
    unknown: [
      {
        name: 'vitrectomy not recorded',
        record: { tamponade: { agent: 'SF6', exchange: 'injection', volumeMl: 4 } },
      },
    ],
  },
});
