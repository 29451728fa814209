import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-without-size',
  family: 'buckle',
  level: 'omission',
  title: 'An element without its width or form',
  why: 'Whoever removes or adds to it in ten years needs to know what it is.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: implants', certainty: 'R2' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const base = `buckle.elements.${index}`;
      const missing = [
        element.widthMm === undefined ? { field: `${base}.widthMm`, what: 'width' } : undefined,
        element.form === undefined ? { field: `${base}.form`, what: 'form' } : undefined,
        element.role === undefined ? { field: `${base}.role`, what: 'role' } : undefined,
      ].filter((one) => one !== undefined);
      if (missing.length === 0) return [];
      const message = `${elementName(element, index)} is recorded without its ${listWords(missing.map(({ what }) => what))}.`;
      return [{ fields: missing.map(({ field }) => field), message }];
    }),
  examples: {
    fires: [
      {
        name: 'no width',
        fields: 'buckle.elements.0.widthMm',
        record: { buckle: { elements: [{ role: 'encircling', form: 'band' }] } },
      },
    ],
    silent: [
      {
        name: 'complete',
        record: { buckle: { elements: [{ role: 'encircling', form: 'band', widthMm: 2.5 }] } },
      },
    ],
    unknown: [{ name: 'no elements recorded', record: { buckle: { peritomy: 'full-circle' } } }],
  },
});
