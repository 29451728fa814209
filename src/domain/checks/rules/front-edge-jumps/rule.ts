import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'front-edge-jumps',
  family: 'buckle',
  level: 'caution',
  title: 'The front edge of an element differs widely between quadrants',
  why: 'A decimal point may be missing; an element that runs that obliquely slips.',
  source: { text: 'Front edge usually 2–3 mm behind the insertions', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { superotemporal, superonasal, inferonasal, inferotemporal } =
        element.frontEdgeByQuadrantMm ?? {};
      const edges = [superotemporal, superonasal, inferonasal, inferotemporal, element.frontEdgeMm].filter(
        (mm) => mm !== undefined,
      );
      const least = Math.min(...edges);
      const most = Math.max(...edges);
      if (edges.length < 2 || most - least <= 6) return [];
      const field = (['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'] as const).find(
        (quadrant) => element.frontEdgeByQuadrantMm?.[quadrant] === most,
      );
      return [
        {
          fields: [
            field === undefined
              ? `buckle.elements.${index}.frontEdgeMm`
              : `buckle.elements.${index}.frontEdgeByQuadrantMm.${field}`,
          ],
          message: `The front edge of element ${index + 1} is recorded from ${numberWords(least)} to ${numberWords(most)} mm behind its reference.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: '25 for 2.5',
        fields: 'buckle.elements.0.frontEdgeByQuadrantMm.superonasal',
        record: { buckle: { elements: [{ frontEdgeMm: 3, frontEdgeByQuadrantMm: { superonasal: 25 } }] } },
      },
    ],
    silent: [
      {
        name: 'a little further back',
        record: { buckle: { elements: [{ frontEdgeMm: 3, frontEdgeByQuadrantMm: { superonasal: 5 } }] } },
      },
    ],
    unknown: [
      {
        name: 'one place only',
        record: { buckle: { elements: [{ frontEdgeByQuadrantMm: { superonasal: 25 } }] } },
      },
    ],
  },
});
