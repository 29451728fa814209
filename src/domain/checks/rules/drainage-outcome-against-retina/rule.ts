import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'drainage-outcome-against-retina',
  family: 'drainage',
  level: 'contradiction',
  title: 'What came of the drainage and the retina at the end do not agree',
  why: 'What was left at the end decides when the eye is seen again.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  unless: ['fluid-against-flat'],
  check: ({ drainage, endOfCase, tamponade }) => {
    const outcome = drainage?.outcome;
    const retina = endOfCase?.retina;
    if (outcome === undefined || retina === undefined) return [];
    const drained = outcome === 'complete' && retina === 'detached';
    const left =
      (outcome === 'partial' || outcome === 'dry') &&
      retina === 'flat' &&
      tamponade?.agent === 'none' &&
      drainage?.kind === 'external';
    if (!drained && !left) return [];
    return [
      {
        fields: ['endOfCase.retina', 'drainage.outcome'],
        message: `Drainage is recorded as ${labelOf('drainage.outcome', outcome)}, and the retina at the end as ${labelOf('endOfCase.retina', retina)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'drained completely, still detached',
        fields: 'endOfCase.retina',
        record: { drainage: { kind: 'external', outcome: 'complete' }, endOfCase: { retina: 'detached' } },
      },
      {
        name: 'fluid left, flat',
        fields: 'endOfCase.retina',
        record: {
          drainage: { kind: 'external', outcome: 'partial' },
          tamponade: { agent: 'none' },
          endOfCase: { retina: 'flat' },
        },
      },
    ],
    silent: [
      {
        name: 'the rest pressed out by air',
        record: {
          drainage: { kind: 'external', outcome: 'partial' },
          tamponade: { agent: 'air' },
          endOfCase: { retina: 'flat' },
        },
      },
    ],
    unknown: [
      { name: 'retina not recorded', record: { drainage: { kind: 'external', outcome: 'complete' } } },
    ],
  },
});
