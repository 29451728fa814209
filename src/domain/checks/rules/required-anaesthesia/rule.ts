import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'required-anaesthesia',
  family: 'standards',
  level: 'omission',
  title: 'The anaesthesia is not recorded',
  why: 'Anaesthesia is a required item of an operative note.',
  source: { text: 'C-CDA Operative Note: anaesthesia 59774-0; tag A-0959', certainty: 'R' },
  answerable: true,
  check: ({ anaesthesia }) =>
    anaesthesia?.kind === undefined
      ? [{ fields: ['anaesthesia.kind'], message: 'Not recorded: the kind of anaesthesia.' }]
      : [],
  examples: {
    fires: [{ name: 'nothing', fields: 'anaesthesia.kind', record: {} }],
    silent: [{ name: 'general', record: { anaesthesia: { kind: 'general' } } }],
    unknown: [],
  },
});
