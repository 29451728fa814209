import { defineRule } from '../../define-rule.ts';
import { numberWords, previousOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'keratometry-unusual',
  family: 'refraction',
  level: 'caution',
  title: 'A curvature of the cornea that is rare',
  why: 'The lens implant is chosen from it; digits may have changed places.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const k = record.before?.keratometryDioptres;
    if (
      k === undefined ||
      (k >= 37 && k <= 50) ||
      previousOf(record).some(({ what }) => what === 'refractive-surgery')
    )
      return [];
    return [
      {
        fields: ['before.keratometryDioptres'],
        message: `A mean keratometry of ${numberWords(k)} D is recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '34 for 43',
        fields: 'before.keratometryDioptres',
        record: { before: { keratometryDioptres: 34 } },
      },
    ],
    silent: [
      { name: 'as usual', record: { before: { keratometryDioptres: 43.5 } } },
      {
        name: 'after refractive surgery',
        record: {
          before: {
            keratometryDioptres: 36,
            previousOperations: [{ what: 'refractive-surgery', eye: 'left' }],
          },
        },
      },
    ],
    unknown: [{ name: 'not measured', record: { before: { axialLengthMm: 24 } } }],
  },
});
