import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'drainage-without-outcome',
  family: 'drainage',
  level: 'omission',
  title: 'Drainage without its outcome, place or means',
  why: 'Fluid left, blood or incarceration change what is done next.',
  source: { text: 'RC.02.01.03: each finding', certainty: 'R' },
  answerable: true,
  check: ({ drainage }) => {
    if (drainage?.kind === undefined || drainage.kind === 'none') return [];
    const external = drainage.kind === 'external' || drainage.kind === 'both';
    const missing = [
      drainage.outcome === undefined ? { field: 'drainage.outcome', what: 'its outcome' } : undefined,
      external && drainage.clock === undefined ? { field: 'drainage.clock', what: 'where' } : undefined,
      external && drainage.externalMethod === undefined
        ? { field: 'drainage.externalMethod', what: 'by what means' }
        : undefined,
    ].filter((one) => one !== undefined);
    if (missing.length === 0) return [];
    const message = `Subretinal fluid was drained (${labelOf('drainage.kind', drainage.kind)}); ${listWords(missing.map(({ what }) => what))} ${missing.length === 1 ? 'is' : 'are'} not recorded.`;
    return [{ fields: missing.map(({ field }) => field), message }];
  },
  examples: {
    fires: [
      { name: 'external', fields: 'drainage.outcome', record: { drainage: { kind: 'external', clock: 7 } } },
    ],
    silent: [
      {
        name: 'complete',
        record: { drainage: { kind: 'external', clock: 7, externalMethod: 'needle', outcome: 'complete' } },
      },
    ],
    unknown: [{ name: 'not recorded', record: { drainage: { clock: 7 } } }],
  },
});
