import { defineRule } from '../../define-rule.ts';
import { lensImplantOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'bag-without-capsule',
  family: 'implants',
  level: 'caution',
  title: 'An implant in the bag after lensectomy or in an aphakic eye',
  why: 'A lensectomy usually takes the bag with it; the place of the implant decides its power.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const work = record.vitreous?.lensWork;
    const aphakic = record.before?.lens === 'aphakic';
    if (lensImplantOf(record)?.position !== 'bag' || (work !== 'lensectomy' && !aphakic)) return [];
    return [
      {
        fields: [
          'vitreous.lensImplant.position',
          work === 'lensectomy' ? 'vitreous.lensWork' : 'before.lens',
        ],
        message: `The implant is recorded as in the bag, ${work === 'lensectomy' ? 'after lensectomy' : 'in an eye that was aphakic'}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'after lensectomy',
        fields: 'vitreous.lensImplant.position',
        record: { vitreous: { lensWork: 'lensectomy', lensImplant: { position: 'bag' } } },
      },
    ],
    silent: [
      {
        name: 'after phacoemulsification',
        record: { vitreous: { lensWork: 'phacoemulsification', lensImplant: { position: 'bag' } } },
      },
      {
        name: 'in the sulcus',
        record: { vitreous: { lensWork: 'lensectomy', lensImplant: { position: 'sulcus' } } },
      },
    ],
    unknown: [
      {
        name: 'position not recorded',
        record: { vitreous: { lensWork: 'lensectomy', lensImplant: { form: 'acrylic' } } },
      },
    ],
  },
});
