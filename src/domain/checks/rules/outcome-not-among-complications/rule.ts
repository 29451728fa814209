import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'outcome-not-among-complications',
  family: 'drainage',
  level: 'omission',
  title: 'Haemorrhage or incarceration at drainage that is not among the complications',
  why: 'Complications are what auditors count and the next reader looks for.',
  source: { text: 'C-CDA Operative Note: complications 55109-3', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const outcome = record.drainage?.outcome;
    const listed = record.endOfCase?.complications;
    if ((outcome !== 'haemorrhage' && outcome !== 'incarceration') || !Array.isArray(listed)) return [];
    const fitting =
      outcome === 'incarceration'
        ? ['retinal-incarceration', 'other']
        : ['subretinal-haemorrhage', 'choroidal-haemorrhage', 'vitreous-haemorrhage', 'other'];
    if (listed.some(({ kind }) => kind === undefined || fitting.includes(kind))) return [];
    return [
      {
        fields: ['endOfCase.complications', 'drainage.outcome'],
        message: `Drainage is recorded with ${labelOf('drainage.outcome', outcome)}; it is not among the complications.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'haemorrhage',
        fields: 'endOfCase.complications',
        record: {
          drainage: { kind: 'external', outcome: 'haemorrhage' },
          endOfCase: { complications: [{ kind: 'corneal-oedema' }] },
        },
      },
    ],
    silent: [
      {
        name: 'among them',
        record: {
          drainage: { kind: 'external', outcome: 'haemorrhage' },
          endOfCase: { complications: [{ kind: 'subretinal-haemorrhage' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'complications not recorded',
        record: { drainage: { kind: 'external', outcome: 'haemorrhage' } },
      },
    ],
  },
});
