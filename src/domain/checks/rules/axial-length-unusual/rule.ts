import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'axial-length-unusual',
  family: 'refraction',
  level: 'caution',
  title: 'An axial length that hardly exists in adults',
  why: 'Figures on the band, the gas and the lens implant are worked out from it.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ before }) => {
    const length = before?.axialLengthMm;
    if (length === undefined || (length >= 19 && length <= 35)) return [];
    return [
      {
        fields: ['before.axialLengthMm'],
        message: `An axial length of ${numberWords(length)} mm is recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'digits changed places',
        fields: 'before.axialLengthMm',
        record: { before: { axialLengthMm: 42.3 } },
      },
    ],
    silent: [{ name: 'a very long eye', record: { before: { axialLengthMm: 33.4 } } }],
    unknown: [{ name: 'not measured', record: { before: { lens: 'phakic' } } }],
  },
});
