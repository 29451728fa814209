import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'conjunctiva-opened-not-closed',
  family: 'buckle',
  level: 'contradiction',
  title: 'The conjunctiva was opened, and its closure does not apply',
  why: 'An opening over an element that is not closed exposes it.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: closure',
    certainty: 'R2',
  },
  answerable: false,
  check: ({ buckle }) => {
    const opening = buckle?.peritomy;
    if (
      (opening !== 'full-circle' && opening !== 'limited') ||
      buckle?.conjunctivalClosure !== 'not-applicable'
    )
      return [];
    return [
      {
        fields: ['buckle.conjunctivalClosure', 'buckle.peritomy'],
        message: `The conjunctival opening is recorded as ${labelOf('buckle.peritomy', opening)}, and its closure as not applicable.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'opened, not closed',
        fields: 'buckle.conjunctivalClosure',
        record: { buckle: { peritomy: 'full-circle', conjunctivalClosure: 'not-applicable' } },
      },
    ],
    silent: [
      { name: 'not opened', record: { buckle: { peritomy: 'none', conjunctivalClosure: 'not-applicable' } } },
      { name: 'glued', record: { buckle: { peritomy: 'limited', conjunctivalClosure: 'glue' } } },
    ],
    unknown: [
      { name: 'opening not recorded', record: { buckle: { conjunctivalClosure: 'not-applicable' } } },
    ],
  },
});
