import { defineRule } from '../../define-rule.ts';
import { elementsOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'shortened-without-ring',
  family: 'tension',
  level: 'contradiction',
  title: 'A shortening of an element that does not go round the eye',
  why: 'Only a closed ring can be shortened; another element may have been meant.',
  source: { text: 'h = ΔL/2π holds for a ring: IOVS abstract 2357577', certainty: 'R' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap(({ role, shortenedMm }, index) =>
      (role === 'segment' || role === 'meridional' || role === 'under-band') &&
      shortenedMm !== undefined &&
      shortenedMm > 0
        ? [
            {
              fields: [`buckle.elements.${index}.shortenedMm`, `buckle.elements.${index}.role`],
              message: `Element ${index + 1} is a ${labelOf('buckle.elements.role', role)}, and is recorded as shortened by ${numberWords(shortenedMm)} mm.`,
            },
          ]
        : [],
    ),
  examples: {
    fires: [
      {
        name: 'a segment shortened',
        fields: 'buckle.elements.0.shortenedMm',
        record: { buckle: { elements: [{ role: 'segment', shortenedMm: 6 }] } },
      },
    ],
    silent: [
      {
        name: 'a band shortened',
        record: { buckle: { elements: [{ role: 'encircling', shortenedMm: 6 }] } },
      },
    ],
    unknown: [{ name: 'role not recorded', record: { buckle: { elements: [{ shortenedMm: 6 }] } } }],
  },
});
