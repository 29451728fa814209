import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'thicker-than-its-form',
  family: 'buckle',
  level: 'contradiction',
  title: 'An element thicker than its form can be',
  why: 'Width and thickness may have changed places, or a decimal point is missing.',
  source: { text: 'Bands 0.6–1.25 mm thick; round sponges as thick as wide, or halved', certainty: 'M' },
  answerable: false,
  unless: ['element-of-impossible-size'],
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { form, widthMm, thicknessMm } = element;
      if (form === undefined || thicknessMm === undefined) return [];
      const flat = form === 'band' || form === 'strip';
      const wrong = (flat && thicknessMm > 2.5) || (widthMm !== undefined && thicknessMm > widthMm + 0.3);
      if (!wrong) return [];
      const wide = widthMm === undefined ? '' : `${numberWords(widthMm)} mm wide and `;
      return [
        {
          fields: [`buckle.elements.${index}.thicknessMm`, `buckle.elements.${index}.widthMm`],
          message: `${elementName(element, index)} is recorded as a ${labelOf('buckle.elements.form', form)} ${wide}${numberWords(thicknessMm)} mm thick.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'a band of 6 mm',
        fields: 'buckle.elements.0.thicknessMm',
        record: {
          buckle: { elements: [{ role: 'encircling', form: 'band', widthMm: 2.5, thicknessMm: 6 }] },
        },
      },
      {
        name: 'a round sponge that is not round',
        fields: 'buckle.elements.0.thicknessMm',
        record: {
          buckle: { elements: [{ role: 'segment', form: 'round-sponge', widthMm: 4, thicknessMm: 7 }] },
        },
      },
    ],
    silent: [
      {
        name: 'a halved sponge',
        record: {
          buckle: { elements: [{ role: 'segment', form: 'round-sponge', widthMm: 5, thicknessMm: 2.5 }] },
        },
      },
      {
        name: 'oval',
        record: {
          buckle: { elements: [{ role: 'segment', form: 'oval-sponge', widthMm: 7.5, thicknessMm: 5.5 }] },
        },
      },
    ],
    unknown: [
      { name: 'form not recorded', record: { buckle: { elements: [{ widthMm: 2.5, thicknessMm: 6 }] } } },
    ],
  },
});
