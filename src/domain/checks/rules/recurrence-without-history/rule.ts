import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'recurrence-without-history',
  family: 'diagnosis',
  level: 'omission',
  title: 'A recurrence without the earlier operation',
  why: 'What was done before, and when, decides the plan and the modifier.',
  source: { text: 'CPT modifier 78: return for recurrence in the global period', certainty: 'R' },
  answerable: true,
  check: ({ before }) =>
    before?.recurrent === true && before.previousOperations === undefined
      ? [
          {
            fields: ['before.previousOperations'],
            message: 'The detachment is recorded as recurrent; the earlier operation is not recorded.',
          },
        ]
      : [],
  examples: {
    fires: [
      { name: 'no history', fields: 'before.previousOperations', record: { before: { recurrent: true } } },
    ],
    silent: [
      {
        name: 'history',
        record: { before: { recurrent: true, previousOperations: [{ what: 'vitrectomy' }] } },
      },
      { name: 'first', record: { before: { recurrent: false } } },
    ],
    unknown: [{ name: 'not said', record: { before: { macula: 'on' } } }],
  },
});
