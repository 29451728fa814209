import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'no-antisepsis',
  family: 'medicines',
  level: 'caution',
  title: 'No antisepsis before opening the eye',
  why: 'Povidone-iodine is what keeps germs out of the eye; leaving it out is unusual.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ anaesthesia }) =>
    anaesthesia?.antisepsis === 'none'
      ? [{ fields: ['anaesthesia.antisepsis'], message: 'Antisepsis is recorded as none.' }]
      : [],
  examples: {
    fires: [
      { name: 'none', fields: 'anaesthesia.antisepsis', record: { anaesthesia: { antisepsis: 'none' } } },
    ],
    silent: [{ name: 'chlorhexidine', record: { anaesthesia: { antisepsis: 'chlorhexidine' } } }],
    unknown: [{ name: 'not recorded', record: { anaesthesia: { kind: 'general' } } }],
  },
});
