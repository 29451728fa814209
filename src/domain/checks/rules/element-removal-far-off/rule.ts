import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-removal-far-off',
  family: 'aftercare',
  level: 'caution',
  title: 'A temporary element to be released unusually early or late',
  why: 'After two to three months the scar holds; earlier it may not, later the band has grown in.',
  source: { text: 'An absorbable knot lets the band go after about 2–3 months', certainty: 'P' },
  answerable: true,
  unless: ['removal-planned-of-permanent-element'],
  check: (record) => {
    const months = record.aftercare?.elementRemovalInMonths;
    if (months === undefined || (months >= 0.5 && months <= 12)) return [];
    return [
      {
        fields: ['aftercare.elementRemovalInMonths'],
        message: `Release or removal of the element is planned in ${numberWords(months)} months.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '30 months',
        fields: 'aftercare.elementRemovalInMonths',
        record: { aftercare: { elementRemovalInMonths: 30 } },
      },
    ],
    silent: [{ name: 'three months', record: { aftercare: { elementRemovalInMonths: 3 } } }],
    unknown: [{ name: 'not planned', record: { aftercare: { reviewInDays: 1 } } }],
  },
});
