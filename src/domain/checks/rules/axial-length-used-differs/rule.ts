import { defineRule } from '../../define-rule.ts';
import { lensImplantOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'axial-length-used-differs',
  family: 'refraction',
  level: 'caution',
  title: 'The implant was chosen by another axial length than the one recorded',
  why: 'One millimetre is about 2.5 D.',
  source: { text: 'About 2.5–2.7 D per mm at the spectacle plane: Olsen', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const used = lensImplantOf(record)?.axialLengthUsedMm;
    const measured = record.before?.axialLengthMm;
    if (used === undefined || measured === undefined || Math.abs(used - measured) <= 0.5) return [];
    return [
      {
        fields: ['vitreous.lensImplant.axialLengthUsedMm', 'before.axialLengthMm'],
        message: `The implant was chosen for an axial length of ${numberWords(used)} mm; ${numberWords(measured)} mm is recorded before.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'two millimetres',
        fields: 'vitreous.lensImplant.axialLengthUsedMm',
        record: { before: { axialLengthMm: 26.1 }, vitreous: { lensImplant: { axialLengthUsedMm: 24.1 } } },
      },
    ],
    silent: [
      {
        name: 'the same',
        record: { before: { axialLengthMm: 26.1 }, vitreous: { lensImplant: { axialLengthUsedMm: 26.1 } } },
      },
    ],
    unknown: [
      {
        name: 'not recorded',
        record: { before: { axialLengthMm: 26.1 }, vitreous: { lensImplant: { form: 'acrylic' } } },
      },
    ],
  },
});
