import { defineRule } from '../../define-rule.ts';
import { capital, labelOf, listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'block-without-agent',
  family: 'medicines',
  level: 'omission',
  title: 'A block without what was given, or how much',
  why: 'Anaesthesia is a required item of an operative note.',
  source: { text: 'C-CDA Operative Note: anaesthesia 59774-0', certainty: 'R' },
  answerable: true,
  check: ({ anaesthesia }) => {
    const { kind, agents } = anaesthesia ?? {};
    if (kind !== 'sub-tenon' && kind !== 'peribulbar' && kind !== 'retrobulbar') return [];
    const name = capital(labelOf('anaesthesia.kind', kind));
    if (agents === undefined || agents === 'none') {
      return [
        {
          fields: ['anaesthesia.agents'],
          message: `${name}: the local agent is recorded ${agents === 'none' ? 'as none' : 'nowhere'}.`,
        },
      ];
    }
    const missing = missingFrom(
      agents.flatMap(({ drug, volumeMl }, index) => [
        { field: `anaesthesia.agents.${index}.drug`, what: `the drug of agent ${index + 1}`, value: drug },
        {
          field: `anaesthesia.agents.${index}.volumeMl`,
          what: `the volume of ${drug ?? `agent ${index + 1}`}`,
          value: volumeMl,
        },
      ]),
    );
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `${name}: not recorded: ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'no agent', fields: 'anaesthesia.agents', record: { anaesthesia: { kind: 'peribulbar' } } },
      {
        name: 'no volume',
        fields: 'anaesthesia.agents.0.volumeMl',
        record: { anaesthesia: { kind: 'peribulbar', agents: [{ drug: 'Lidocaine' }] } },
      },
    ],
    silent: [
      { name: 'general', record: { anaesthesia: { kind: 'general' } } },
      {
        name: 'complete',
        record: { anaesthesia: { kind: 'peribulbar', agents: [{ drug: 'Lidocaine', volumeMl: 6 }] } },
      },
    ],
    unknown: [{ name: 'kind not recorded', record: { anaesthesia: { sedation: true } } }],
  },
});
