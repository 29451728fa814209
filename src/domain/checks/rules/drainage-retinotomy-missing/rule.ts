import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'drainage-retinotomy-missing',
  family: 'drainage',
  level: 'contradiction',
  title: 'Drained through a retinotomy that was not made',
  why: 'A retinotomy is a break that needs retinopexy.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ drainage, vitreous }) =>
    drainage?.internalThrough === 'retinotomy' && vitreous?.retinotomies === 'none'
      ? [
          {
            fields: ['drainage.internalThrough', 'vitreous.retinotomies'],
            message: 'Fluid was drained through a drainage retinotomy; retinotomies are recorded as none.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'none made',
        fields: 'drainage.internalThrough',
        record: { drainage: { internalThrough: 'retinotomy' }, vitreous: { retinotomies: 'none' } },
      },
    ],
    silent: [
      {
        name: 'made',
        record: {
          drainage: { internalThrough: 'retinotomy' },
          vitreous: { retinotomies: [{ kind: 'drainage' }] },
        },
      },
    ],
    unknown: [{ name: 'retinotomies not recorded', record: { drainage: { internalThrough: 'retinotomy' } } }],
  },
});
