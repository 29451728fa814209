import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'lens-work-against-lens',
  family: 'vitreous',
  level: 'contradiction',
  title: 'The lens was removed from an eye that had none of its own',
  why: 'Lens state decides refraction, oil and the next operation.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ before, vitreous }) => {
    const lens = before?.lens;
    const work = vitreous?.lensWork;
    const own = work === 'phacoemulsification' || work === 'lensectomy';
    const wrong =
      (own && (lens === 'pseudophakic' || lens === 'aphakic')) ||
      (work === 'implant-removed' && (lens === 'phakic' || lens === 'cataract' || lens === 'aphakic'));
    if (!wrong || lens === undefined || work === undefined) return [];
    return [
      {
        fields: ['vitreous.lensWork', 'before.lens'],
        message: `The eye is recorded as ${labelOf('before.lens', lens)} before; in the operation: ${labelOf('vitreous.lensWork', work)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'phacoemulsification of a pseudophakic eye',
        fields: 'vitreous.lensWork',
        record: { before: { lens: 'pseudophakic' }, vitreous: { lensWork: 'phacoemulsification' } },
      },
    ],
    silent: [
      {
        name: 'of a cataract',
        record: { before: { lens: 'cataract' }, vitreous: { lensWork: 'phacoemulsification' } },
      },
    ],
    unknown: [{ name: 'lens not recorded', record: { vitreous: { lensWork: 'phacoemulsification' } } }],
  },
});
