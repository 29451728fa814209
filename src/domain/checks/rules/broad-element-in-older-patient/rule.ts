import { defineRule } from '../../define-rule.ts';
import { ageOf, elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'broad-element-in-older-patient',
  family: 'buckle',
  level: 'caution',
  title: 'A broad element in an older patient',
  why: 'Choroidal detachment follows broad buckles in older people.',
  source: { text: 'Harm to look for: choroidal detachment (broad buckles, older people)', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const age = ageOf(record);
    const index = elementsOf(record).findIndex(({ widthMm = 0 }) => widthMm >= 9);
    if (age === undefined || age < 75 || age > 115 || index < 0) return [];
    const width = numberWords(elementsOf(record)[index]?.widthMm ?? 0);
    return [
      {
        fields: [`buckle.elements.${index}.widthMm`, 'who.patient.dateOfBirth'],
        message: `An element ${width} mm wide in a patient of ${age} years.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '9 mm at 80',
        fields: 'buckle.elements.0.widthMm',
        record: {
          who: { patient: { dateOfBirth: '1946-01-01' }, startedAt: '2026-12-01T10:00' },
          buckle: { elements: [{ role: 'segment', widthMm: 9 }] },
        },
      },
    ],
    silent: [
      {
        name: '9 mm at 40',
        record: {
          who: { patient: { dateOfBirth: '1986-01-01' }, startedAt: '2026-12-01T10:00' },
          buckle: { elements: [{ role: 'segment', widthMm: 9 }] },
        },
      },
    ],
    unknown: [{ name: 'age not known', record: { buckle: { elements: [{ role: 'segment', widthMm: 9 }] } } }],
  },
});
