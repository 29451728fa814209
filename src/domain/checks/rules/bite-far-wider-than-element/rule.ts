import { defineRule } from '../../define-rule.ts';
import { elementsOf, fixationsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'bite-far-wider-than-element',
  family: 'buckle',
  level: 'caution',
  title: 'A suture bite far wider than the element',
  why: 'A decimal point may be missing; a bite that wide folds the sclera high over the element.',
  source: { text: 'A suture bite about 2 mm wider than the element, a tunnel 0.5 mm', certainty: 'M' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) =>
      fixationsOf(element).flatMap(({ kind, biteMm }, at) => {
        const width = element.widthMm;
        if (width === undefined || biteMm === undefined || kind === undefined) return [];
        if (biteMm <= width + (kind === 'scleral-tunnel' ? 3 : 7)) return [];
        return [
          {
            fields: [`buckle.elements.${index}.fixation.${at}.biteMm`, `buckle.elements.${index}.widthMm`],
            message: `The bite of fixation ${at + 1} spans ${numberWords(biteMm)} mm; the element is ${numberWords(width)} mm wide.`,
          },
        ];
      }),
    ),
  examples: {
    fires: [
      {
        name: '25 mm for 2.5',
        fields: 'buckle.elements.0.fixation.0.biteMm',
        record: {
          buckle: { elements: [{ widthMm: 2.5, fixation: [{ kind: 'mattress-suture', biteMm: 25 }] }] },
        },
      },
    ],
    silent: [
      {
        name: '2 mm wider',
        record: {
          buckle: { elements: [{ widthMm: 2.5, fixation: [{ kind: 'mattress-suture', biteMm: 4.5 }] }] },
        },
      },
    ],
    unknown: [
      {
        name: 'width not recorded',
        record: { buckle: { elements: [{ fixation: [{ kind: 'mattress-suture', biteMm: 25 }] }] } },
      },
    ],
  },
});
