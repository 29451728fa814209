import { defineRule } from '../../define-rule.ts';
import { closureOf, elementsOf, isEncircling, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'closure-on-open-element',
  family: 'closure',
  level: 'contradiction',
  title: 'Ends joined of an element that does not go round, or none joined of one that does',
  why: 'A segment has no ends to join; a band without a join is not a band.',
  source: { text: 'Geometry', certainty: 'P' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const base = `buckle.elements.${index}`;
      if (isEncircling(element)) {
        return element.closure === 'not-applicable'
          ? [
              {
                fields: [`${base}.closure`, `${base}.role`],
                message: 'The band goes round the eye; the join of its ends is recorded as not applicable.',
              },
            ]
          : [];
      }
      const kind = closureOf(element)?.kind;
      if (element.role === undefined || kind === undefined) return [];
      return [
        {
          fields: [`${base}.closure.kind`, `${base}.role`],
          message: `Element ${index + 1} is a ${labelOf('buckle.elements.role', element.role)}; its ends are recorded as joined by ${labelOf('buckle.elements.closure.kind', kind)}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'a sleeve on a segment',
        fields: 'buckle.elements.0.closure.kind',
        record: { buckle: { elements: [{ role: 'segment', closure: { kind: 'sleeve' } }] } },
      },
      {
        name: 'a band without a join',
        fields: 'buckle.elements.0.closure',
        record: { buckle: { elements: [{ role: 'encircling', closure: 'not-applicable' }] } },
      },
    ],
    silent: [
      {
        name: 'a sleeve on a band',
        record: { buckle: { elements: [{ role: 'encircling', closure: { kind: 'sleeve' } }] } },
      },
      {
        name: 'a segment',
        record: { buckle: { elements: [{ role: 'segment', closure: 'not-applicable' }] } },
      },
    ],
    unknown: [
      { name: 'role not recorded', record: { buckle: { elements: [{ closure: { kind: 'sleeve' } }] } } },
    ],
  },
});
