import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-without-fixation',
  family: 'buckle',
  level: 'omission',
  title: 'An element without a word on its fixation',
  why: 'An element that slips supports another place.',
  source: { text: 'Fixation by mattress suture or scleral tunnel, usually one a quadrant', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) =>
      element.fixation !== undefined || element.role === 'under-band' || element.role === undefined
        ? []
        : [
            {
              fields: [`buckle.elements.${index}.fixation`],
              message: `${elementName(element, index)} is recorded without how it was fixed.`,
            },
          ],
    ),
  examples: {
    fires: [
      {
        name: 'band',
        fields: 'buckle.elements.0.fixation',
        record: { buckle: { elements: [{ role: 'encircling' }] } },
      },
    ],
    silent: [
      { name: 'none, said', record: { buckle: { elements: [{ role: 'encircling', fixation: 'none' }] } } },
      { name: 'held by the band above it', record: { buckle: { elements: [{ role: 'under-band' }] } } },
    ],
    unknown: [{ name: 'role not recorded', record: { buckle: { elements: [{ widthMm: 3 }] } } }],
  },
});
