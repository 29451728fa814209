import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, lensImplantOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'implant-with-tightened-band',
  family: 'refraction',
  level: 'caution',
  title: 'A lens implant and a tightened band in one operation',
  why: 'The band lengthens the eye by about 0.8 to 1 mm, so that the implant leaves it 1.4 to 2.8 D more short-sighted.',
  source: {
    text: 'Smiddy, Arch Ophthalmol 1989;107:1469; BMC Ophthalmol 2021 s12886-021-01928-0',
    certainty: 'R',
  },
  answerable: true,
  check: (record) => {
    const index = elementsOf(record).findIndex(
      (element) =>
        isEncircling(element) && (element.shortenedMm ?? 0) >= 3 && element.intention !== 'temporary',
    );
    const lens = lensImplantOf(record);
    if (lens?.powerDioptres === undefined || index < 0 || record.aftercare?.refractiveChangeTold !== false)
      return [];
    return [
      {
        fields: ['vitreous.lensImplant.powerDioptres', `buckle.elements.${index}.shortenedMm`],
        message: `An implant of ${numberWords(lens.powerDioptres)} D was put in, and a band shortened by ${numberWords(elementsOf(record)[index]?.shortenedMm ?? 0)} mm; the patient was not told of the change of glasses.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'implant and band',
        fields: 'vitreous.lensImplant.powerDioptres',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 8, intention: 'permanent' }] },
          vitreous: { lensImplant: { powerDioptres: 20 } },
          aftercare: { refractiveChangeTold: false },
        },
      },
    ],
    silent: [
      {
        name: 'told',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 8, intention: 'permanent' }] },
          vitreous: { lensImplant: { powerDioptres: 20 } },
          aftercare: { refractiveChangeTold: true },
        },
      },
    ],
    unknown: [
      {
        name: 'not recorded whether told',
        record: {
          buckle: { elements: [{ role: 'encircling', shortenedMm: 8 }] },
          vitreous: { lensImplant: { powerDioptres: 20 } },
        },
      },
    ],
  },
});
