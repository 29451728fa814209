import { defineRule } from '../../define-rule.ts';
import { elementsOf, fixationsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'bite-narrower-than-element',
  family: 'buckle',
  level: 'contradiction',
  title: 'A suture bite narrower than the element it holds',
  why: 'A mattress suture spans the element; its bite cannot be narrower.',
  source: { text: 'A suture bite about 2 mm wider than the element', certainty: 'M' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const width = element.widthMm;
      if (width === undefined) return [];
      return fixationsOf(element).flatMap(({ kind, biteMm }, at) =>
        kind === undefined || biteMm === undefined || biteMm >= width
          ? []
          : [
              {
                fields: [
                  `buckle.elements.${index}.fixation.${at}.biteMm`,
                  `buckle.elements.${index}.widthMm`,
                ],
                message: `The bite of fixation ${at + 1} spans ${numberWords(biteMm)} mm; the element is ${numberWords(width)} mm wide.`,
              },
            ],
      );
    }),
  examples: {
    fires: [
      {
        name: 'bite of 5 mm over 7 mm',
        fields: 'buckle.elements.0.fixation.0.biteMm',
        record: {
          buckle: { elements: [{ widthMm: 7, fixation: [{ kind: 'mattress-suture', biteMm: 5 }] }] },
        },
      },
    ],
    silent: [
      {
        name: '9 mm over 7 mm',
        record: {
          buckle: { elements: [{ widthMm: 7, fixation: [{ kind: 'mattress-suture', biteMm: 9 }] }] },
        },
      },
    ],
    unknown: [
      {
        name: 'bite not recorded',
        record: { buckle: { elements: [{ widthMm: 7, fixation: [{ kind: 'mattress-suture' }] }] } },
      },
    ],
  },
});
