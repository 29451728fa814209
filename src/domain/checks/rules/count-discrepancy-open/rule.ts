import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'count-discrepancy-open',
  family: 'team',
  level: 'omission',
  title: 'A discrepancy in the counts, or no count, without an explanation',
  why: 'Something may have been left behind.',
  source: { text: 'Surgical safety practice', certainty: 'P' },
  answerable: true,
  check: ({ endOfCase }) => {
    const { counts, countsNote } = endOfCase ?? {};
    if ((counts !== 'discrepancy' && counts !== 'not-done') || countsNote !== undefined) return [];
    const what =
      counts === 'discrepancy'
        ? 'A discrepancy in the counts is recorded'
        : 'The counts are recorded as not done';
    return [{ fields: ['endOfCase.countsNote'], message: `${what}; what was done about it is not.` }];
  },
  examples: {
    fires: [
      {
        name: 'discrepancy',
        fields: 'endOfCase.countsNote',
        record: { endOfCase: { counts: 'discrepancy' } },
      },
    ],
    silent: [
      {
        name: 'explained',
        record: { endOfCase: { counts: 'discrepancy', countsNote: 'needle found on the floor' } },
      },
    ],
    unknown: [{ name: 'not recorded', record: { endOfCase: {} } }],
  },
});
