import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'macula-off-duration-missing',
  family: 'diagnosis',
  level: 'omission',
  title: 'The macula was off, and for how long is not recorded',
  why: 'How long the macula was off is what the patient’s sight depends on.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ before }) =>
    before?.macula === 'off' && before.maculaOffDays === undefined
      ? [
          {
            fields: ['before.maculaOffDays'],
            message: 'The macula is recorded as off; for how many days is not.',
          },
        ]
      : [],
  examples: {
    fires: [{ name: 'no duration', fields: 'before.maculaOffDays', record: { before: { macula: 'off' } } }],
    silent: [
      { name: 'six days', record: { before: { macula: 'off', maculaOffDays: 6 } } },
      { name: 'could not be told', record: { before: { macula: 'off', maculaOffDays: 'not-applicable' } } },
    ],
    unknown: [{ name: 'macula not recorded', record: { before: { diagnosis: 'rhegmatogenous' } } }],
  },
});
