import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'two-bands',
  family: 'buckle',
  level: 'caution',
  title: 'Two encircling bands of one form',
  why: 'One may have been entered twice; two tight bands raise the risk of ischaemia.',
  source: { text: 'Harm to look for: anterior segment ischaemia', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const bands = elementsOf(record).flatMap((element, index) =>
      isEncircling(element) && (element.form === 'band' || element.form === 'strip') ? [index] : [],
    );
    if (bands.length < 2) return [];
    return [
      {
        fields: bands.map((index) => `buckle.elements.${index}.role`),
        message: `Elements ${listWords(bands.map((index) => String(index + 1)))} are all recorded as bands round the eye.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'twice a band',
        fields: 'buckle.elements.0.role',
        record: {
          buckle: {
            elements: [
              { role: 'encircling', form: 'band' },
              { role: 'encircling', form: 'band' },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'a tyre in which the band lies',
        record: {
          buckle: {
            elements: [
              { role: 'encircling', form: 'band' },
              { role: 'encircling', form: 'tyre' },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'form not recorded',
        record: { buckle: { elements: [{ role: 'encircling' }, { role: 'encircling' }] } },
      },
    ],
  },
});
