import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'lens-removed-implant-not-recorded',
  family: 'implants',
  level: 'omission',
  title: 'A lens was removed, and whether an implant went in is not recorded',
  why: 'An eye left aphakic needs another plan for oil, gas and glasses.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: implants', certainty: 'R2' },
  answerable: true,
  check: ({ vitreous }) => {
    const work = vitreous?.lensWork;
    if (work === undefined || work === 'none' || vitreous?.lensImplant !== undefined) return [];
    return [
      {
        fields: ['vitreous.lensImplant.form'],
        message: `The lens: ${labelOf('vitreous.lensWork', work)}; whether an implant was put in is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'not said',
        fields: 'vitreous.lensImplant.form',
        record: { vitreous: { lensWork: 'lensectomy' } },
      },
    ],
    silent: [
      {
        name: 'left aphakic',
        record: { vitreous: { lensWork: 'lensectomy', lensImplant: 'not-applicable' } },
      },
      {
        name: 'implant',
        record: { vitreous: { lensWork: 'phacoemulsification', lensImplant: { form: 'acrylic' } } },
      },
    ],
    unknown: [{ name: 'lens work not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
