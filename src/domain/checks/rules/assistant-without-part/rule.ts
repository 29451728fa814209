import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'assistant-without-part',
  family: 'team',
  level: 'omission',
  title: 'An assistant without a name or without what was done',
  why: 'Who did what is a required item of an operative note.',
  source: {
    text: '42 CFR 482.51(b)(6), tag A-0959: surgeons, assistants and what each did',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ who }) => {
    const assistants = Array.isArray(who?.assistants) ? who.assistants : [];
    const missing = missingFrom(
      assistants.flatMap(({ name, did }, index) => [
        { field: `who.assistants.${index}.name`, what: `the name of assistant ${index + 1}`, value: name },
        {
          field: `who.assistants.${index}.did`,
          what: `what ${name ?? `assistant ${index + 1}`} did`,
          value: did,
        },
      ]),
    );
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
        name: 'part not said',
        fields: 'who.assistants.0.did',
        record: { who: { assistants: [{ name: 'B. Marlowick' }] } },
      },
      {
        name: 'not named',
        fields: 'who.assistants.0.name',
        record: { who: { assistants: [{ did: 'held the slings' }] } },
      },
    ],
    silent: [
      { name: 'no assistant', record: { who: { assistants: 'none' } } },
      {
        name: 'named, with the part',
        record: { who: { assistants: [{ name: 'B. Marlowick', did: 'held the slings' }] } },
      },
    ],
    unknown: [{ name: 'assistants not recorded', record: { who: { surgeon: { name: 'A. Fenwarden' } } } }],
  },
});
