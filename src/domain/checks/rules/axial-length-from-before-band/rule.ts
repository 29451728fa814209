import { defineRule } from '../../define-rule.ts';
import { dateWords, lensImplantOf, previousOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'axial-length-from-before-band',
  family: 'refraction',
  level: 'caution',
  title: 'A lens implant by an axial length measured before an encircling band',
  why: 'A band lengthens the eye by about 0.8 to 1 mm, which leaves it 1.4 to 2.8 D myopic.',
  source: {
    text: 'Smiddy, Arch Ophthalmol 1989;107:1469; BMC Ophthalmol 2021 s12886-021-01928-0',
    certainty: 'R',
  },
  answerable: true,
  check: (record) => {
    const measured = record.before?.axialLengthMeasuredOn;
    const eye = record.who?.eye;
    if (lensImplantOf(record) === undefined || measured === undefined || eye === undefined) return [];
    const band = previousOf(record).find(
      (one) => one.what === 'encircling-band' && one.eye === eye && one.on !== undefined && one.on > measured,
    );
    if (band === undefined) return [];
    return [
      {
        fields: ['before.axialLengthMeasuredOn', 'vitreous.lensImplant.axialLengthUsedMm'],
        message: `The axial length was measured on ${dateWords(measured)}, before the encircling band of ${dateWords(band.on ?? '')}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'old measurement',
        fields: 'before.axialLengthMeasuredOn',
        record: {
          who: { eye: 'left' },
          before: {
            axialLengthMeasuredOn: '2020-01-01',
            previousOperations: [{ what: 'encircling-band', eye: 'left', on: '2022-01-01' }],
          },
          vitreous: { lensImplant: { form: 'one-piece acrylic' } },
        },
      },
    ],
    silent: [
      {
        name: 'measured since',
        record: {
          who: { eye: 'left' },
          before: {
            axialLengthMeasuredOn: '2024-01-01',
            previousOperations: [{ what: 'encircling-band', eye: 'left', on: '2022-01-01' }],
          },
          vitreous: { lensImplant: { form: 'one-piece acrylic' } },
        },
      },
    ],
    unknown: [
      {
        name: 'date not recorded',
        record: {
          who: { eye: 'left' },
          before: { previousOperations: [{ what: 'encircling-band', eye: 'left', on: '2022-01-01' }] },
          vitreous: { lensImplant: { form: 'one-piece acrylic' } },
        },
      },
    ],
  },
});
