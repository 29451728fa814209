import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling } from '../../facts.ts';

export const rule = defineRule({
  id: 'refraction-not-told',
  family: 'refraction',
  level: 'caution',
  title: 'A tightened permanent band, and the patient was not told of the change of glasses',
  why: 'An encircling band makes the eye about 1.4 to 2.8 D more myopic.',
  source: { text: 'Smiddy 1989; BMC Ophthalmol 2021 s12886-021-01928-0', certainty: 'R' },
  answerable: true,
  check: (record) =>
    record.aftercare?.refractiveChangeTold === false &&
    elementsOf(record).some((element) => isEncircling(element) && (element.shortenedMm ?? 0) > 0)
      ? [
          {
            fields: ['aftercare.refractiveChangeTold'],
            message: 'A band was tightened; the patient was not told that glasses are expected to change.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'not told',
        fields: 'aftercare.refractiveChangeTold',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 5 }] },
          aftercare: { refractiveChangeTold: false },
        },
      },
    ],
    silent: [
      {
        name: 'told',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 5 }] },
          aftercare: { refractiveChangeTold: true },
        },
      },
    ],
    unknown: [
      { name: 'not recorded', record: { buckle: { elements: [{ role: 'encircling', shortenedMm: 5 }] } } },
    ],
  },
});
