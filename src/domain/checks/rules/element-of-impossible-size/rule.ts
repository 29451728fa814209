import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-of-impossible-size',
  family: 'buckle',
  level: 'contradiction',
  title: 'An element of a size that does not exist',
  why: 'A decimal point in the wrong place is the usual cause.',
  source: { text: 'Bands 2 to 5 mm, tyres 7 to 9 mm, sponges 3 to 7.5 mm', certainty: 'M' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { widthMm, thicknessMm, form } = element;
      const most = form === 'band' || form === 'strip' ? 7 : 15;
      const base = `buckle.elements.${index}`;
      if (widthMm !== undefined && form !== undefined && (widthMm < 1 || widthMm > most)) {
        return [
          {
            fields: [`${base}.widthMm`],
            message: `${elementName(element, index)} is recorded as a ${labelOf('buckle.elements.form', form)} ${numberWords(widthMm)} mm wide.`,
          },
        ];
      }
      if (thicknessMm !== undefined && (thicknessMm < 0.2 || thicknessMm > 9)) {
        return [
          {
            fields: [`${base}.thicknessMm`],
            message: `${elementName(element, index)} is recorded as ${numberWords(thicknessMm)} mm thick.`,
          },
        ];
      }
      return [];
    }),
  examples: {
    fires: [
      {
        name: '35 mm',
        fields: 'buckle.elements.0.widthMm',
        record: { buckle: { elements: [{ form: 'band', widthMm: 35 }] } },
      },
    ],
    silent: [
      {
        name: '3.5 mm',
        record: { buckle: { elements: [{ form: 'band', widthMm: 3.5, thicknessMm: 0.75 }] } },
      },
    ],
    unknown: [{ name: 'no size', record: { buckle: { elements: [{ form: 'band' }] } } }],
  },
});
