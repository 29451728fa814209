import { defineRule } from '../../define-rule.ts';
import { closureOf, elementsOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'closure-material-against-kind',
  family: 'closure',
  level: 'contradiction',
  title: 'The join of the ends and its material do not go together',
  why: 'Whether the band lasts and how it is released depend on both.',
  source: { text: 'Ends joined by silicone sleeve, clip, suture or a knot', certainty: 'P' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { kind, material } = closureOf(element) ?? {};
      if (kind === undefined || material === undefined || material === 'not-applicable') return [];
      const thread = material !== 'silicone' && material !== 'metal';
      const wrong =
        (kind === 'sleeve' && material !== 'silicone') ||
        (kind === 'clip' && thread) ||
        ((kind === 'suture' || kind === 'knot') && !thread);
      if (!wrong) return [];
      return [
        {
          fields: [`buckle.elements.${index}.closure.material`, `buckle.elements.${index}.closure.kind`],
          message: `The ends are recorded as joined by a ${labelOf('buckle.elements.closure.kind', kind)} of ${labelOf('buckle.elements.closure.material', material)}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'sleeve of nylon',
        fields: 'buckle.elements.0.closure.material',
        record: { buckle: { elements: [{ closure: { kind: 'sleeve', material: 'nylon' } }] } },
      },
      {
        name: 'knot of metal',
        fields: 'buckle.elements.0.closure.material',
        record: { buckle: { elements: [{ closure: { kind: 'knot', material: 'metal' } }] } },
      },
    ],
    silent: [
      {
        name: 'silicone sleeve',
        record: { buckle: { elements: [{ closure: { kind: 'sleeve', material: 'silicone' } }] } },
      },
      {
        name: 'metal clip',
        record: { buckle: { elements: [{ closure: { kind: 'clip', material: 'metal' } }] } },
      },
    ],
    unknown: [
      { name: 'material not recorded', record: { buckle: { elements: [{ closure: { kind: 'knot' } }] } } },
    ],
  },
});
