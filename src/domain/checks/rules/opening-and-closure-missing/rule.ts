import { defineRule } from '../../define-rule.ts';
import { elementsOf, listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'opening-and-closure-missing',
  family: 'buckle',
  level: 'omission',
  title: 'A buckle without the conjunctival opening or how it was closed',
  why: 'Incision and closure are required items of an operative note.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: incision, closure',
    certainty: 'R2',
  },
  answerable: true,
  check: (record) => {
    if (elementsOf(record).length === 0) return [];
    const missing = missingFrom([
      { field: 'buckle.peritomy', what: 'the conjunctival opening', value: record.buckle?.peritomy },
      {
        field: 'buckle.conjunctivalClosure',
        what: 'how the conjunctiva was closed',
        value: record.buckle?.conjunctivalClosure,
      },
    ]);
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `An element was placed; not recorded: ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'closure not said',
        fields: 'buckle.conjunctivalClosure',
        record: { buckle: { elements: [{ role: 'segment' }], peritomy: 'limited' } },
      },
    ],
    silent: [
      { name: 'no buckle', record: { buckle: { elements: 'none' } } },
      {
        name: 'complete',
        record: {
          buckle: { elements: [{ role: 'segment' }], peritomy: 'limited', conjunctivalClosure: 'glue' },
        },
      },
    ],
    unknown: [{ name: 'buckle not recorded', record: { buckle: { peritomy: 'limited' } } }],
  },
});
