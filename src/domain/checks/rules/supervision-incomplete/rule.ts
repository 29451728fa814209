import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'supervision-incomplete',
  family: 'team',
  level: 'omission',
  title: 'A supervisor without a name, or not said whether scrubbed',
  why: 'A supervisor at the table and one on the telephone are different things to an auditor.',
  source: {
    text: '42 CFR 482.51(b)(6), tag A-0959: surgeons, assistants and what each did',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ who }) => {
    const supervisor = who?.supervisor;
    if (supervisor === undefined || supervisor === 'none') return [];
    const missing = missingFrom([
      { field: 'who.supervisor.name', what: 'the name of the supervisor', value: supervisor.name },
      {
        field: 'who.supervisor.scrubbed',
        what: `whether ${supervisor.name ?? 'the supervisor'} was scrubbed`,
        value: supervisor.scrubbed,
      },
    ]);
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `Not recorded: ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'scrubbed or not',
        fields: 'who.supervisor.scrubbed',
        record: { who: { supervisor: { name: 'C. Orlebar' } } },
      },
      {
        name: 'not named',
        fields: 'who.supervisor.name',
        record: { who: { supervisor: { scrubbed: true } } },
      },
    ],
    silent: [
      { name: 'no supervisor', record: { who: { supervisor: 'none' } } },
      { name: 'complete', record: { who: { supervisor: { name: 'C. Orlebar', scrubbed: false } } } },
    ],
    unknown: [{ name: 'not recorded', record: { who: { surgeon: { name: 'A. Fenwarden' } } } }],
  },
});
