import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'hyaloid-left-attached',
  family: 'vitreous',
  level: 'caution',
  title: 'A vitrectomy for detachment with the hyaloid left attached',
  why: 'Vitreous left on the retina contracts and opens breaks again.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ vitreous }) =>
    vitreous?.vitrectomy === true && vitreous.hyaloid === 'left-attached'
      ? [
          {
            fields: ['vitreous.hyaloid'],
            message: 'A vitrectomy is recorded, and the posterior hyaloid as left attached.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'left',
        fields: 'vitreous.hyaloid',
        record: { vitreous: { vitrectomy: true, hyaloid: 'left-attached' } },
      },
    ],
    silent: [{ name: 'induced', record: { vitreous: { vitrectomy: true, hyaloid: 'induced' } } }],
    unknown: [{ name: 'hyaloid not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
