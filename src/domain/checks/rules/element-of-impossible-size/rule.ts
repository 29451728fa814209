import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, labelOf, numberWords, withArticle } from '../../facts.ts';

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
      const { widthMm, thicknessMm, lengthMm, form, role } = element;
      const base = `buckle.elements.${index}`;
      const name = elementName(element, index);
      const widths = {
        band: [1, 7],
        strip: [1, 7],
        tyre: [4, 15],
        'round-sponge': [2, 10],
        'oval-sponge': [2, 15],
        wedge: [1, 15],
      } as const;
      const [least, most] = form === undefined ? [0, 40] : widths[form];
      if (widthMm !== undefined && (widthMm < least || widthMm > most)) {
        return [
          {
            fields: [`${base}.widthMm`],
            message: `${name} is recorded as ${withArticle(labelOf('buckle.elements.form', form ?? ''))} ${numberWords(widthMm)} mm wide.`,
          },
        ];
      }
      if (thicknessMm !== undefined && (thicknessMm < 0.2 || thicknessMm > 9)) {
        return [
          {
            fields: [`${base}.thicknessMm`],
            message: `${name} is recorded as ${numberWords(thicknessMm)} mm thick.`,
          },
        ];
      }
      const longest = role === 'meridional' ? 25 : role === 'segment' ? 80 : undefined;
      return lengthMm !== undefined && longest !== undefined && (lengthMm < 2 || lengthMm > longest)
        ? [
            {
              fields: [`${base}.lengthMm`],
              message: `${name}, a ${labelOf('buckle.elements.role', role ?? '')}, is recorded as ${numberWords(lengthMm)} mm long.`,
            },
          ]
        : [];
    }),
  examples: {
    fires: [
      {
        name: '25 mm for 2.5',
        fields: 'buckle.elements.0.widthMm',
        record: { buckle: { elements: [{ role: 'encircling', form: 'band', widthMm: 25 }] } },
      },
      {
        name: 'a tyre of 0.7 mm',
        fields: 'buckle.elements.0.widthMm',
        record: { buckle: { elements: [{ role: 'segment', form: 'tyre', widthMm: 0.7 }] } },
      },
      {
        name: '12.5 mm thick',
        fields: 'buckle.elements.0.thicknessMm',
        record: { buckle: { elements: [{ role: 'encircling', thicknessMm: 12.5 }] } },
      },
      {
        name: 'a radial element of 75 mm',
        fields: 'buckle.elements.0.lengthMm',
        record: { buckle: { elements: [{ role: 'meridional', lengthMm: 75 }] } },
      },
    ],
    silent: [
      {
        name: 'usual sizes',
        record: {
          buckle: {
            elements: [
              { role: 'encircling', form: 'band', widthMm: 2.5, thicknessMm: 0.6, lengthMm: 125 },
              { role: 'segment', form: 'tyre', widthMm: 7, lengthMm: 22 },
              { role: 'meridional', form: 'oval-sponge', widthMm: 7.5, thicknessMm: 5.5, lengthMm: 9 },
            ],
          },
        },
      },
    ],
    unknown: [
      { name: 'form not recorded', record: { buckle: { elements: [{ role: 'encircling', widthMm: 25 }] } } },
    ],
  },
});
