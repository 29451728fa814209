import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'complications-against-outcome',
  family: 'standards',
  level: 'contradiction',
  title: 'No complications, and an outcome that is one',
  why: 'Of 999 operative reports 57% said whether there were complications; those that say so must be right.',
  source: { text: 'Zwintscher, J Surg Res 2012;177:211', certainty: 'R' },
  answerable: false,
  check: ({ endOfCase, drainage, vitreous }) => {
    if (endOfCase?.complications !== 'none') return [];
    const found = [
      drainage?.outcome === 'haemorrhage'
        ? { field: 'drainage.outcome', what: 'haemorrhage at the drainage site' }
        : undefined,
      drainage?.outcome === 'incarceration'
        ? { field: 'drainage.outcome', what: 'retinal incarceration' }
        : undefined,
      vitreous?.heavyLiquid === 'not-removed'
        ? { field: 'vitreous.heavyLiquid', what: 'heavy liquid that could not be removed' }
        : undefined,
    ].filter((one) => one !== undefined);
    if (found.length === 0) return [];
    return [
      {
        fields: ['endOfCase.complications', ...found.map(({ field }) => field)],
        message: `Complications are recorded as none, with ${listWords(found.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'haemorrhage',
        fields: 'endOfCase.complications',
        record: { drainage: { outcome: 'haemorrhage' }, endOfCase: { complications: 'none' } },
      },
    ],
    silent: [
      {
        name: 'recorded',
        record: {
          drainage: { outcome: 'haemorrhage' },
          endOfCase: { complications: [{ kind: 'subretinal-haemorrhage' }] },
        },
      },
    ],
    unknown: [{ name: 'complications not recorded', record: { drainage: { outcome: 'haemorrhage' } } }],
  },
});
