import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'internal-drainage-without-vitrectomy',
  family: 'drainage',
  level: 'contradiction',
  title: 'Internal drainage without vitrectomy',
  why: 'Fluid is drained internally through an open vitreous cavity.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: false,
  check: ({ drainage, vitreous }) =>
    (drainage?.kind === 'internal' || drainage?.kind === 'both') && vitreous?.vitrectomy === false
      ? [
          {
            fields: ['drainage.kind', 'vitreous.vitrectomy'],
            message: 'Fluid was drained internally, and no vitrectomy is recorded.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'no vitrectomy',
        fields: 'drainage.kind',
        record: { drainage: { kind: 'internal' }, vitreous: { vitrectomy: false } },
      },
    ],
    silent: [
      { name: 'with vitrectomy', record: { drainage: { kind: 'internal' }, vitreous: { vitrectomy: true } } },
    ],
    unknown: [{ name: 'vitrectomy not recorded', record: { drainage: { kind: 'internal' } } }],
  },
});
