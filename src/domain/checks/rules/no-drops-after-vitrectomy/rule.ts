import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'no-drops-after-vitrectomy',
  family: 'medicines',
  level: 'caution',
  title: 'No drops at all after an operation inside the eye',
  why: 'Most eyes have an antibiotic and a steroid; leaving them out is possible and unusual.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    record.aftercare?.drops === 'none' && record.vitreous?.vitrectomy === true
      ? [{ fields: ['aftercare.drops'], message: 'A vitrectomy is recorded, and drops afterwards as none.' }]
      : [],
  examples: {
    fires: [
      {
        name: 'none',
        fields: 'aftercare.drops',
        record: { vitreous: { vitrectomy: true }, aftercare: { drops: 'none' } },
      },
    ],
    silent: [
      {
        name: 'drops',
        record: { vitreous: { vitrectomy: true }, aftercare: { drops: [{ drug: 'Dexamethasone' }] } },
      },
    ],
    unknown: [{ name: 'not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
