import { defineRule } from '../../define-rule.ts';
import { elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'buckle-under-drops',
  family: 'medicines',
  level: 'caution',
  title: 'An element on the sclera under drops alone',
  why: 'Pulling on the muscles hurts; the kind of anaesthesia may be a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    record.anaesthesia?.kind === 'topical' && elementsOf(record).length > 0
      ? [
          {
            fields: ['anaesthesia.kind', 'buckle.elements'],
            message: 'Anaesthesia is recorded as topical, with an element placed on the sclera.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'topical',
        fields: 'anaesthesia.kind',
        record: { anaesthesia: { kind: 'topical' }, buckle: { elements: [{ role: 'segment' }] } },
      },
    ],
    silent: [
      {
        name: 'block',
        record: { anaesthesia: { kind: 'sub-tenon' }, buckle: { elements: [{ role: 'segment' }] } },
      },
      {
        name: 'injection of gas',
        record: { anaesthesia: { kind: 'topical' }, buckle: { elements: 'none' } },
      },
    ],
    unknown: [{ name: 'buckle not recorded', record: { anaesthesia: { kind: 'topical' } } }],
  },
});
