import { defineRule } from '../../define-rule.ts';
import { lensImplantOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'implant-power-unusual',
  family: 'implants',
  level: 'caution',
  title: 'A lens implant whose power hardly fits the eye',
  why: 'A sign, a decimal point or the other eye’s lens is the usual cause.',
  source: { text: 'P = A − 2.5·length − 0.9·K, with A about 118.5', certainty: 'M' },
  answerable: true,
  check: (record) => {
    const lens = lensImplantOf(record);
    const power = lens?.powerDioptres;
    const length = lens?.axialLengthUsedMm ?? record.before?.axialLengthMm;
    if (power === undefined || length === undefined || lens?.position === 'anterior-chamber') return [];
    const expected = 118.5 - 2.5 * length - 0.9 * (record.before?.keratometryDioptres ?? 43.5);
    if (Math.abs(power - expected) <= 8) return [];
    return [
      {
        fields: [
          'vitreous.lensImplant.powerDioptres',
          lens?.axialLengthUsedMm === undefined
            ? 'before.axialLengthMm'
            : 'vitreous.lensImplant.axialLengthUsedMm',
        ],
        message: `A lens implant of ${numberWords(power)} D is recorded in an eye of ${numberWords(length)} mm; about ${Math.round(expected)} D would leave it without glasses for distance (an estimate).`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '2 for 20',
        fields: 'vitreous.lensImplant.powerDioptres',
        record: { before: { axialLengthMm: 24 }, vitreous: { lensImplant: { powerDioptres: 2 } } },
      },
    ],
    silent: [
      {
        name: 'as usual',
        record: { before: { axialLengthMm: 24 }, vitreous: { lensImplant: { powerDioptres: 19.5 } } },
      },
      {
        name: 'left short-sighted',
        record: { before: { axialLengthMm: 27 }, vitreous: { lensImplant: { powerDioptres: 14.5 } } },
      },
    ],
    unknown: [{ name: 'length not recorded', record: { vitreous: { lensImplant: { powerDioptres: 2 } } } }],
  },
});
