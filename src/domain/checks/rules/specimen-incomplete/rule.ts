import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'specimen-incomplete',
  family: 'standards',
  level: 'omission',
  title: 'A specimen without what it is or where it went',
  why: 'A specimen that nobody waits for is lost.',
  source: { text: 'C-CDA Operative Note: specimens 59773-2; RC.02.01.03', certainty: 'R' },
  answerable: true,
  check: ({ endOfCase }) => {
    const specimens = Array.isArray(endOfCase?.specimens) ? endOfCase.specimens : [];
    const missing = missingFrom(
      specimens.flatMap(({ what, sentTo }, index) => [
        { field: `endOfCase.specimens.${index}.what`, words: `what specimen ${index + 1} is`, value: what },
        {
          field: `endOfCase.specimens.${index}.sentTo`,
          words: `where ${what ?? `specimen ${index + 1}`} was sent`,
          value: sentTo,
        },
      ]),
    );
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `Not recorded: ${listWords(missing.map(({ words }) => words))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'sent nowhere',
        fields: 'endOfCase.specimens.0.sentTo',
        record: { endOfCase: { specimens: [{ what: 'undiluted vitreous' }] } },
      },
    ],
    silent: [
      { name: 'none', record: { endOfCase: { specimens: 'none' } } },
      {
        name: 'complete',
        record: { endOfCase: { specimens: [{ what: 'undiluted vitreous', sentTo: 'microbiology' }] } },
      },
    ],
    unknown: [{ name: 'specimens not recorded', record: { endOfCase: { retina: 'flat' } } }],
  },
});
