import { defineRule } from '../../define-rule.ts';
import { elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'buckle-without-opening',
  family: 'buckle',
  level: 'contradiction',
  title: 'An element on the sclera, and no conjunctival opening',
  why: 'An element cannot be placed through closed conjunctiva.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: false,
  check: (record) => {
    if (elementsOf(record).length === 0) return [];
    const { peritomy } = record.buckle ?? {};
    if (peritomy === 'none')
      return [
        {
          fields: ['buckle.peritomy', 'buckle.elements'],
          message: 'An element was placed, and the conjunctival opening is recorded as none.',
        },
      ];
    return [];
  },
  examples: {
    fires: [
      {
        name: 'none',
        fields: 'buckle.peritomy',
        record: { buckle: { elements: [{ role: 'segment' }], peritomy: 'none' } },
      },
    ],
    silent: [
      { name: 'limited', record: { buckle: { elements: [{ role: 'segment' }], peritomy: 'limited' } } },
    ],
    unknown: [{ name: 'not recorded', record: { buckle: { elements: [{ role: 'segment' }] } } }],
  },
});
