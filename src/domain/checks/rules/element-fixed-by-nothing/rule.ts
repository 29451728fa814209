import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-fixed-by-nothing',
  family: 'buckle',
  level: 'caution',
  title: 'An element that is recorded as not fixed',
  why: 'An element that slips supports another place.',
  source: { text: 'Usually one fixation a quadrant', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) =>
      element.fixation === 'none' && element.role !== 'under-band' && element.role !== undefined
        ? [
            {
              fields: [`buckle.elements.${index}.fixation`],
              message: `${elementName(element, index)} is recorded with no fixation.`,
            },
          ]
        : [],
    ),
  examples: {
    fires: [
      {
        name: 'held by nothing',
        fields: 'buckle.elements.0.fixation',
        record: { buckle: { elements: [{ role: 'segment', fixation: 'none' }] } },
      },
    ],
    silent: [
      {
        name: 'held by the band over it',
        record: {
          buckle: {
            elements: [
              { role: 'encircling', fixation: [{ quadrant: 'superonasal' }] },
              { role: 'under-band', fixation: 'none' },
            ],
          },
        },
      },
    ],
    unknown: [{ name: 'fixation not recorded', record: { buckle: { elements: [{ role: 'segment' }] } } }],
  },
});
