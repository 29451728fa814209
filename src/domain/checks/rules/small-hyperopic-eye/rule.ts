import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'small-hyperopic-eye',
  family: 'refraction',
  level: 'caution',
  title: 'An encircling band in a short eye',
  why: 'A band crowds a small eye and can close its angle.',
  source: { text: 'Harm to look for: angle closure in small hyperopic eyes', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const length = record.before?.axialLengthMm;
    const index = elementsOf(record).findIndex(
      ({ role, widthMm }) => role === 'encircling' && (widthMm ?? 0) >= 3.5,
    );
    if (length === undefined || length >= 21.5 || index < 0) return [];
    const width = numberWords(elementsOf(record)[index]?.widthMm ?? 0);
    return [
      {
        fields: [`buckle.elements.${index}.widthMm`, 'before.axialLengthMm'],
        message: `A band ${width} mm wide in an eye of ${numberWords(length)} mm axial length.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '5 mm in 20.5 mm',
        fields: 'buckle.elements.0.widthMm',
        record: {
          before: { axialLengthMm: 20.5 },
          buckle: { elements: [{ role: 'encircling', widthMm: 5 }] },
        },
      },
    ],
    silent: [
      {
        name: '24 mm',
        record: { before: { axialLengthMm: 24 }, buckle: { elements: [{ role: 'encircling', widthMm: 5 }] } },
      },
    ],
    unknown: [
      { name: 'not measured', record: { buckle: { elements: [{ role: 'encircling', widthMm: 5 }] } } },
    ],
  },
});
