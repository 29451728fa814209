import { defineRule } from '../../define-rule.ts';
import { labelOf, lensImplantOf, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'silicone-implant-with-oil',
  family: 'implants',
  level: 'caution',
  title: 'A silicone lens implant with silicone oil',
  why: 'Oil sticks to a silicone implant for good and blurs it.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const form = lensImplantOf(record)?.form;
    const oil = oilOf(record);
    if (form === undefined || oil === undefined || !/silicone/i.test(form)) return [];
    return [
      {
        fields: ['vitreous.lensImplant.form', 'tamponade.agent'],
        message: `The lens implant is recorded as ${form}, with ${labelOf('tamponade.agent', oil)} in the eye.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'silicone and oil',
        fields: 'vitreous.lensImplant.form',
        record: {
          vitreous: { lensImplant: { form: 'three-piece silicone' } },
          tamponade: { agent: 'silicone-oil' },
        },
      },
    ],
    silent: [
      {
        name: 'acrylic',
        record: {
          vitreous: { lensImplant: { form: 'three-piece acrylic' } },
          tamponade: { agent: 'silicone-oil' },
        },
      },
    ],
    unknown: [
      {
        name: 'material not recorded',
        record: { vitreous: { lensImplant: { powerDioptres: 20 } }, tamponade: { agent: 'silicone-oil' } },
      },
    ],
  },
});
