import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'removal-planned-of-permanent-element',
  family: 'aftercare',
  level: 'contradiction',
  title: 'A release or removal is planned, and there is nothing to release',
  why: 'The patient would be listed for an operation that nobody intends.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const months = record.aftercare?.elementRemovalInMonths;
    const elements = record.buckle?.elements;
    if (months === undefined || elements === undefined) return [];
    const kept = Array.isArray(elements) && elements.every(({ intention }) => intention === 'permanent');
    if (elements !== 'none' && !kept) return [];
    return [
      {
        fields: [
          'aftercare.elementRemovalInMonths',
          kept ? 'buckle.elements.0.intention' : 'buckle.elements',
        ],
        message: `Release or removal of the element is planned in ${numberWords(months)} months; ${kept ? 'every element is intended to be permanent' : 'no element is recorded'}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'permanent',
        fields: 'aftercare.elementRemovalInMonths',
        record: {
          buckle: { elements: [{ role: 'encircling', intention: 'permanent' }] },
          aftercare: { elementRemovalInMonths: 3 },
        },
      },
      {
        name: 'no element',
        fields: 'aftercare.elementRemovalInMonths',
        record: { buckle: { elements: 'none' }, aftercare: { elementRemovalInMonths: 3 } },
      },
    ],
    silent: [
      {
        name: 'temporary',
        record: {
          buckle: { elements: [{ role: 'encircling', intention: 'temporary' }] },
          aftercare: { elementRemovalInMonths: 3 },
        },
      },
    ],
    unknown: [
      {
        name: 'intention not recorded',
        record: { buckle: { elements: [{ role: 'encircling' }] }, aftercare: { elementRemovalInMonths: 3 } },
      },
    ],
  },
});
