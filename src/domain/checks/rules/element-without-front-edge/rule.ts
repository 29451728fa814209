import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-without-front-edge',
  family: 'buckle',
  level: 'omission',
  title: 'An element without its distance behind the insertions or the limbus',
  why: 'Whether it holds the break can only be told from where it lies.',
  source: { text: 'Front edge usually 2 to 3 mm behind the insertions', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      if (element.role === undefined || element.role === 'under-band') return [];
      const base = `buckle.elements.${index}`;
      const placed = element.frontEdgeMm !== undefined || element.frontEdgeByQuadrantMm !== undefined;
      if (placed && element.frontEdgeReference !== undefined) return [];
      const field = placed ? `${base}.frontEdgeReference` : `${base}.frontEdgeMm`;
      const what = placed
        ? 'what its front edge was measured from'
        : 'how far behind the insertions or the limbus it lies';
      return [{ fields: [field], message: `${elementName(element, index)} is recorded without ${what}.` }];
    }),
  examples: {
    fires: [
      {
        name: 'no distance',
        fields: 'buckle.elements.0.frontEdgeMm',
        record: { buckle: { elements: [{ role: 'encircling' }] } },
      },
      {
        name: 'no reference',
        fields: 'buckle.elements.0.frontEdgeReference',
        record: { buckle: { elements: [{ role: 'encircling', frontEdgeMm: 3 }] } },
      },
    ],
    silent: [
      {
        name: 'placed',
        record: {
          buckle: { elements: [{ role: 'encircling', frontEdgeMm: 3, frontEdgeReference: 'insertions' }] },
        },
      },
    ],
    unknown: [{ name: 'role not recorded', record: { buckle: { elements: [{ widthMm: 3 }] } } }],
  },
});
