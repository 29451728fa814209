import { defineRule } from '../../define-rule.ts';
import { labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'block-volume-unusual',
  family: 'medicines',
  level: 'caution',
  title: 'A block of an unusual volume',
  why: 'A large volume behind the eye raises the pressure and can close the artery.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ anaesthesia }) => {
    const { kind, agents } = anaesthesia ?? {};
    if (!Array.isArray(agents) || kind === undefined || kind === 'topical' || kind === 'general') return [];
    const volume = agents.reduce((sum, { volumeMl = 0 }) => sum + volumeMl, 0);
    if (volume <= 12) return [];
    return [
      {
        fields: agents.map((_, index) => `anaesthesia.agents.${index}.volumeMl`),
        message: `A ${labelOf('anaesthesia.kind', kind)} of ${numberWords(volume)} mL is recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '50 mL',
        fields: 'anaesthesia.agents.0.volumeMl',
        record: { anaesthesia: { kind: 'sub-tenon', agents: [{ drug: 'Lidocaine', volumeMl: 50 }] } },
      },
    ],
    silent: [
      {
        name: '5 mL',
        record: {
          anaesthesia: {
            kind: 'sub-tenon',
            agents: [
              { drug: 'Lidocaine', volumeMl: 2.5 },
              { drug: 'Bupivacaine', volumeMl: 2.5 },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'kind not recorded',
        record: { anaesthesia: { agents: [{ drug: 'Lidocaine', volumeMl: 50 }] } },
      },
    ],
  },
});
