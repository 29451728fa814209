import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'band-far-from-usual-place',
  family: 'buckle',
  level: 'caution',
  title: 'A band far in front of or behind its usual place',
  why: 'Too far forward it meets the lens and the muscles, too far back the vortex veins and the macula.',
  source: {
    text: 'Front edge usually 2 to 3 mm behind the insertions; vortex veins 14 to 18 mm behind the limbus',
    certainty: 'P',
  },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { frontEdgeMm, frontEdgeReference } = element;
      if (!isEncircling(element) || frontEdgeMm === undefined || frontEdgeReference === undefined) return [];
      const behind = frontEdgeReference === 'insertions' ? frontEdgeMm : frontEdgeMm - 6.6;
      if (behind >= 0.5 && behind <= 8) return [];
      const from = labelOf('buckle.elements.frontEdgeReference', frontEdgeReference);
      return [
        {
          fields: [`buckle.elements.${index}.frontEdgeMm`],
          message: `The front edge of the band lies ${numberWords(frontEdgeMm)} mm behind ${from}; 2 to 3 mm behind the insertions is usual.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: '12 mm',
        fields: 'buckle.elements.0.frontEdgeMm',
        record: {
          buckle: { elements: [{ role: 'encircling', frontEdgeMm: 12, frontEdgeReference: 'insertions' }] },
        },
      },
    ],
    silent: [
      {
        name: '3 mm',
        record: {
          buckle: { elements: [{ role: 'encircling', frontEdgeMm: 3, frontEdgeReference: 'insertions' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'reference not recorded',
        record: { buckle: { elements: [{ role: 'encircling', frontEdgeMm: 12 }] } },
      },
    ],
  },
});
