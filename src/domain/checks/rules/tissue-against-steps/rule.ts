import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'tissue-against-steps',
  family: 'standards',
  level: 'contradiction',
  title: 'The tissue removed does not match what was done',
  why: 'Tissue removed or altered is a required item of an operative note.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: tissue removed or altered', certainty: 'R2' },
  answerable: false,
  check: ({ vitreous, endOfCase }) => {
    const tissue = endOfCase?.tissue;
    if (tissue === undefined) return [];
    const peeled = vitreous?.membranesPeeled;
    const work = vitreous?.lensWork;
    const facts = [
      { what: 'vitreous', done: vitreous?.vitrectomy, field: 'vitreous.vitrectomy', step: 'vitrectomy' },
      {
        what: 'membrane',
        done: peeled === undefined ? undefined : peeled.some((one) => one !== 'none'),
        field: 'vitreous.membranesPeeled',
        step: 'membrane peel',
      },
      {
        what: 'lens',
        done: work === undefined || work === 'implant-removed' ? undefined : work !== 'none',
        field: 'vitreous.lensWork',
        step: 'removal of the lens',
      },
    ] as const;
    const wrong = facts.filter(({ what, done }) => done !== undefined && tissue.includes(what) !== done);
    if (wrong.length === 0) return [];
    const removed = listWords(tissue.map((one) => labelOf('endOfCase.tissue', one)));
    const parts = wrong.map(({ done, step }) => `${step} as ${done === true ? 'done' : 'not done'}`);
    return [
      {
        fields: ['endOfCase.tissue', ...wrong.map(({ field }) => field)],
        message: `Tissue removed is recorded as ${removed}; ${listWords(parts)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'vitrectomy, no vitreous',
        fields: 'endOfCase.tissue',
        record: { vitreous: { vitrectomy: true }, endOfCase: { tissue: ['none'] } },
      },
      {
        name: 'lens, not touched',
        fields: 'endOfCase.tissue',
        record: {
          vitreous: { vitrectomy: true, lensWork: 'none' },
          endOfCase: { tissue: ['vitreous', 'lens'] },
        },
      },
    ],
    silent: [
      {
        name: 'vitreous',
        record: {
          vitreous: { vitrectomy: true, lensWork: 'none', membranesPeeled: ['none'] },
          endOfCase: { tissue: ['vitreous'] },
        },
      },
      { name: 'buckle', record: { vitreous: { vitrectomy: false }, endOfCase: { tissue: ['none'] } } },
    ],
    unknown: [{ name: 'steps not recorded', record: { endOfCase: { tissue: ['vitreous'] } } }],
  },
});
