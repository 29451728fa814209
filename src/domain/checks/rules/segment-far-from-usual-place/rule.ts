import { defineRule } from '../../define-rule.ts';
import { elementsOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'segment-far-from-usual-place',
  family: 'buckle',
  level: 'caution',
  title: 'A local element far in front of or behind its usual place',
  why: 'Far back it lies over the vortex veins and the macula, far forward in front of the retina.',
  source: { text: 'Vortex veins 14 to 18 mm behind the limbus; insertions 5.5 to 7.7 mm', certainty: 'R' },
  answerable: true,
  unless: ['front-edge-in-front-of-insertions'],
  check: (record) =>
    elementsOf(record).flatMap(({ role, frontEdgeMm, frontEdgeReference }, index) => {
      if (
        (role !== 'segment' && role !== 'meridional') ||
        frontEdgeMm === undefined ||
        frontEdgeReference === undefined
      )
        return [];
      const behind = frontEdgeReference === 'insertions' ? frontEdgeMm : frontEdgeMm - 6.6;
      if (behind >= -3 && behind <= 10) return [];
      return [
        {
          fields: [`buckle.elements.${index}.frontEdgeMm`, `buckle.elements.${index}.frontEdgeReference`],
          message: `The front edge of element ${index + 1} is recorded ${numberWords(frontEdgeMm)} mm behind ${labelOf('buckle.elements.frontEdgeReference', frontEdgeReference)}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'far back',
        fields: 'buckle.elements.0.frontEdgeMm',
        record: {
          buckle: { elements: [{ role: 'segment', frontEdgeReference: 'insertions', frontEdgeMm: 14 }] },
        },
      },
    ],
    silent: [
      {
        name: 'in its place',
        record: {
          buckle: { elements: [{ role: 'segment', frontEdgeReference: 'insertions', frontEdgeMm: 3 }] },
        },
      },
    ],
    unknown: [
      {
        name: 'reference not recorded',
        record: { buckle: { elements: [{ role: 'segment', frontEdgeMm: 14 }] } },
      },
    ],
  },
});
