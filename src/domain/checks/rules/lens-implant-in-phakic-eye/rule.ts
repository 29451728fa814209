import { defineRule } from '../../define-rule.ts';
import { labelOf, lensImplantOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'lens-implant-in-phakic-eye',
  family: 'implants',
  level: 'contradiction',
  title: 'A lens implant in an eye whose own lens was not removed',
  why: 'Lens state decides refraction, oil and the next operation.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const lens = record.before?.lens;
    const work = record.vitreous?.lensWork;
    if (lensImplantOf(record) === undefined || (lens !== 'phakic' && lens !== 'cataract') || work !== 'none')
      return [];
    return [
      {
        fields: ['vitreous.lensWork', 'vitreous.lensImplant.form', 'before.lens'],
        message: `The eye is ${labelOf('before.lens', lens)} and its lens was not touched; a lens implant is recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'implant, lens untouched',
        fields: 'vitreous.lensWork',
        record: {
          before: { lens: 'cataract' },
          vitreous: { lensWork: 'none', lensImplant: { form: 'one-piece acrylic' } },
        },
      },
    ],
    silent: [
      {
        name: 'phacoemulsification',
        record: {
          before: { lens: 'cataract' },
          vitreous: { lensWork: 'phacoemulsification', lensImplant: { form: 'one-piece acrylic' } },
        },
      },
    ],
    unknown: [
      {
        name: 'lens work not recorded',
        record: { before: { lens: 'cataract' }, vitreous: { lensImplant: { form: 'one-piece acrylic' } } },
      },
    ],
  },
});
