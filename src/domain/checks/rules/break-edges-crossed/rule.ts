import { defineRule } from '../../define-rule.ts';
import { breaksOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-edges-crossed',
  family: 'breaks',
  level: 'contradiction',
  title: 'A break’s back edge lies in front of its front edge',
  why: 'Whether an element holds the break is worked out from these two.',
  source: { text: 'Geometry', certainty: 'P' },
  answerable: false,
  check: (record) =>
    breaksOf(record).flatMap(({ frontEdgeMm, backEdgeMm }, index) =>
      frontEdgeMm === undefined || backEdgeMm === undefined || frontEdgeMm <= backEdgeMm
        ? []
        : [
            {
              fields: [`breaks.found.${index}.backEdgeMm`, `breaks.found.${index}.frontEdgeMm`],
              message: `Break ${index + 1} would begin ${numberWords(frontEdgeMm)} mm and end ${numberWords(backEdgeMm)} mm behind the limbus.`,
            },
          ],
    ),
  examples: {
    fires: [
      {
        name: 'swapped',
        fields: 'breaks.found.0.backEdgeMm',
        record: { breaks: { found: [{ frontEdgeMm: 14, backEdgeMm: 12 }] } },
      },
    ],
    silent: [{ name: 'in order', record: { breaks: { found: [{ frontEdgeMm: 12, backEdgeMm: 14 }] } } }],
    unknown: [{ name: 'one edge', record: { breaks: { found: [{ frontEdgeMm: 14 }] } } }],
  },
});
