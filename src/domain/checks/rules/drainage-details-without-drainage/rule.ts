import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'drainage-details-without-drainage',
  family: 'drainage',
  level: 'contradiction',
  title: 'No drainage, and details of a drainage',
  why: 'One of the two is a slip.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ drainage }) => {
    if (drainage?.kind === undefined) return [];
    const details = [
      { field: 'drainage.outcome', value: drainage.outcome },
      {
        field: 'drainage.externalMethod',
        value: drainage.kind === 'internal' || drainage.kind === 'none' ? drainage.externalMethod : undefined,
      },
      {
        field: 'drainage.internalThrough',
        value:
          drainage.kind === 'external' || drainage.kind === 'none' ? drainage.internalThrough : undefined,
      },
    ].filter(
      ({ field, value }) => value !== undefined && (drainage.kind === 'none' || field !== 'drainage.outcome'),
    );
    if (details.length === 0) return [];
    const message = `Drainage is recorded as ${labelOf('drainage.kind', drainage.kind)}, with ${listWords(details.map(({ field, value = '' }) => labelOf(field, value)))}.`;
    return [{ fields: ['drainage.kind', ...details.map(({ field }) => field)], message }];
  },
  examples: {
    fires: [
      {
        name: 'none, complete',
        fields: 'drainage.kind',
        record: { drainage: { kind: 'none', outcome: 'complete' } },
      },
    ],
    silent: [
      {
        name: 'external by needle',
        record: { drainage: { kind: 'external', externalMethod: 'needle', outcome: 'complete' } },
      },
    ],
    unknown: [{ name: 'kind not recorded', record: { drainage: { outcome: 'complete' } } }],
  },
});
