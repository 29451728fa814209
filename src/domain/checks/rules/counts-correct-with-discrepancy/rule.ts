import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'counts-correct-with-discrepancy',
  family: 'team',
  level: 'contradiction',
  title: 'Counts that are correct, and a discrepancy explained',
  why: 'Something may have been left behind.',
  source: { text: 'Surgical safety practice', certainty: 'P' },
  answerable: false,
  check: ({ endOfCase }) =>
    endOfCase?.counts === 'correct' &&
    endOfCase.countsNote !== undefined &&
    /missing|lost|discrep|x-?ray|not found|recount/i.test(endOfCase.countsNote)
      ? [
          {
            fields: ['endOfCase.counts', 'endOfCase.countsNote'],
            message: `The counts are recorded as correct, and as a discrepancy: “${endOfCase.countsNote}”.`,
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'a missing swab',
        fields: 'endOfCase.counts',
        record: { endOfCase: { counts: 'correct', countsNote: 'one swab missing, found under the drape' } },
      },
    ],
    silent: [
      { name: 'correct', record: { endOfCase: { counts: 'correct' } } },
      {
        name: 'a discrepancy',
        record: {
          endOfCase: { counts: 'discrepancy', countsNote: 'one swab missing, found under the drape' },
        },
      },
    ],
    unknown: [{ name: 'counts not recorded', record: { endOfCase: { countsNote: 'one swab missing' } } }],
  },
});
