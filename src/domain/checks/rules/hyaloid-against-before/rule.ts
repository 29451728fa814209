import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'hyaloid-against-before',
  family: 'vitreous',
  level: 'contradiction',
  title: 'The hyaloid was already detached, and it was not before',
  why: 'Vitreous left on the retina is a cause of failure.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ before, vitreous }) => {
    const pvd = before?.posteriorVitreousDetachment;
    const hyaloid = vitreous?.hyaloid;
    if (pvd === 'none' && hyaloid === 'already-detached') {
      return [
        {
          fields: ['vitreous.hyaloid', 'before.posteriorVitreousDetachment'],
          message:
            'The posterior vitreous is recorded as not detached before, and the hyaloid as already detached.',
        },
      ];
    }
    if (pvd === 'complete' && (hyaloid === 'induced' || hyaloid === 'left-attached')) {
      return [
        {
          fields: ['vitreous.hyaloid', 'before.posteriorVitreousDetachment'],
          message: `The posterior vitreous is recorded as completely detached before; the hyaloid as ${labelOf('vitreous.hyaloid', hyaloid)}.`,
        },
      ];
    }
    return [];
  },
  examples: {
    fires: [
      {
        name: 'not before, already there',
        fields: 'vitreous.hyaloid',
        record: {
          before: { posteriorVitreousDetachment: 'none' },
          vitreous: { hyaloid: 'already-detached' },
        },
      },
    ],
    silent: [
      {
        name: 'induced',
        record: { before: { posteriorVitreousDetachment: 'none' }, vitreous: { hyaloid: 'induced' } },
      },
    ],
    unknown: [
      {
        name: 'could not be told before',
        record: {
          before: { posteriorVitreousDetachment: 'unknown' },
          vitreous: { hyaloid: 'already-detached' },
        },
      },
    ],
  },
});
