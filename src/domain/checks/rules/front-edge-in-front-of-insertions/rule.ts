import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'front-edge-in-front-of-insertions',
  family: 'buckle',
  level: 'contradiction',
  title: 'An element under the muscles whose front edge is far in front of every insertion',
  why: 'Millimetres behind the insertions were probably written as behind the limbus, which puts the element 6 mm too far forward.',
  source: { text: 'Insertions 5.5 to 7.7 mm behind the limbus: IOVS 2022;63:1877', certainty: 'R' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap(({ frontEdgeReference, frontEdgeMm, role, underMuscles }, index) => {
      if (
        frontEdgeReference !== 'limbus' ||
        frontEdgeMm === undefined ||
        frontEdgeMm >= (role === 'encircling' ? 5 : 3.5)
      )
        return [];
      if (role !== 'encircling' && (underMuscles === undefined || underMuscles.length === 0)) return [];
      return [
        {
          fields: [`buckle.elements.${index}.frontEdgeReference`, `buckle.elements.${index}.frontEdgeMm`],
          message: `The front edge of element ${index + 1} is recorded ${numberWords(frontEdgeMm)} mm behind the limbus; the muscles it runs under insert 5.5 to 7.7 mm behind it.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'limbus for insertions',
        fields: 'buckle.elements.0.frontEdgeReference',
        record: {
          buckle: { elements: [{ role: 'encircling', frontEdgeReference: 'limbus', frontEdgeMm: 2.5 }] },
        },
      },
    ],
    silent: [
      {
        name: 'behind the insertions',
        record: {
          buckle: { elements: [{ role: 'encircling', frontEdgeReference: 'insertions', frontEdgeMm: 2.5 }] },
        },
      },
      {
        name: 'behind the limbus',
        record: {
          buckle: { elements: [{ role: 'encircling', frontEdgeReference: 'limbus', frontEdgeMm: 9 }] },
        },
      },
    ],
    unknown: [
      {
        name: 'reference not recorded',
        record: { buckle: { elements: [{ role: 'encircling', frontEdgeMm: 2.5 }] } },
      },
    ],
  },
});
