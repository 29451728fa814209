import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'refraction-against-axial-length',
  family: 'refraction',
  level: 'caution',
  title: 'Refraction and axial length of a phakic eye that hardly go together',
  why: 'A sign or a decimal point may be wrong; both are used for the next lens implant.',
  source: { text: 'About 2.5–2.7 D per mm at the spectacle plane, from 24 mm: Olsen', certainty: 'R' },
  answerable: true,
  check: ({ before, who }) => {
    const { axialLengthMm: length, sphericalEquivalentDioptres: refraction, lens } = before ?? {};
    if (length === undefined || refraction === undefined || lens !== 'phakic') return [];
    const history = before?.previousOperations;
    if (Array.isArray(history) && history.some((one) => one.eye === undefined || one.eye === who?.eye))
      return [];
    const expected = (23.8 - length) * 2.5;
    if (Math.abs(refraction - expected) <= 8) return [];
    return [
      {
        fields: ['before.sphericalEquivalentDioptres', 'before.axialLengthMm'],
        message: `A spherical equivalent of ${numberWords(refraction)} D is recorded in a phakic eye of ${numberWords(length)} mm.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'long eye, far-sighted',
        fields: 'before.sphericalEquivalentDioptres',
        record: { before: { lens: 'phakic', axialLengthMm: 27.5, sphericalEquivalentDioptres: 8.5 } },
      },
    ],
    silent: [
      {
        name: 'long eye, short-sighted',
        record: { before: { lens: 'phakic', axialLengthMm: 27.5, sphericalEquivalentDioptres: -8.5 } },
      },
      {
        name: 'pseudophakic',
        record: { before: { lens: 'pseudophakic', axialLengthMm: 28, sphericalEquivalentDioptres: -0.5 } },
      },
    ],
    unknown: [
      {
        name: 'lens not recorded',
        record: { before: { axialLengthMm: 27.5, sphericalEquivalentDioptres: 8.5 } },
      },
    ],
  },
});
