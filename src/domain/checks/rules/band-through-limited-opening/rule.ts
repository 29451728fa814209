import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling } from '../../facts.ts';

export const rule = defineRule({
  id: 'band-through-limited-opening',
  family: 'buckle',
  level: 'caution',
  title: 'An encircling band through a limited conjunctival opening',
  why: 'A band passes all four recti; one of the two may be a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const index = elementsOf(record).findIndex(isEncircling);
    if (index < 0 || record.buckle?.peritomy !== 'limited') return [];
    return [
      {
        fields: ['buckle.peritomy', `buckle.elements.${index}.role`],
        message: 'The band goes round the eye; the conjunctival opening is recorded as limited peritomy.',
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'limited',
        fields: 'buckle.peritomy',
        record: { buckle: { elements: [{ role: 'encircling' }], peritomy: 'limited' } },
      },
    ],
    silent: [
      { name: 'a segment', record: { buckle: { elements: [{ role: 'segment' }], peritomy: 'limited' } } },
    ],
    unknown: [{ name: 'opening not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
