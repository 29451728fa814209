import { defineRule } from '../../define-rule.ts';
import { breaksOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'giant-tear-too-small',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A giant tear of less than three clock hours',
  why: 'A giant tear is one of 90° or more; the name changes the operation and the code.',
  source: {
    text: 'Giant tear: 90° or more (3 clock hours) with posterior vitreous detachment',
    certainty: 'R',
  },
  answerable: false,
  check: (record) =>
    breaksOf(record).flatMap(({ kind, extentClockHours }, index) =>
      kind !== 'giant-tear' || extentClockHours === undefined || extentClockHours >= 3
        ? []
        : [
            {
              fields: [`breaks.found.${index}.extentClockHours`, `breaks.found.${index}.kind`],
              message: `Break ${index + 1} is called a giant tear and extends over ${numberWords(extentClockHours)} clock hours; a giant tear has 3 clock hours or more.`,
            },
          ],
    ),
  examples: {
    fires: [
      {
        name: 'two hours',
        fields: 'breaks.found.0.extentClockHours',
        record: { breaks: { found: [{ kind: 'giant-tear', extentClockHours: 2 }] } },
      },
    ],
    silent: [
      { name: 'four hours', record: { breaks: { found: [{ kind: 'giant-tear', extentClockHours: 4 }] } } },
    ],
    unknown: [{ name: 'extent not recorded', record: { breaks: { found: [{ kind: 'giant-tear' }] } } }],
  },
});
