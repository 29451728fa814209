import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'extent-of-large-tear-missing',
  family: 'breaks',
  level: 'omission',
  title: 'A giant tear or dialysis without its extent',
  why: 'From three clock hours a tear is a giant one; the extent is what makes it so.',
  source: { text: 'Giant tear: 90° or more (3 clock hours)', certainty: 'R' },
  answerable: true,
  check: (record) =>
    breaksOf(record).flatMap(({ kind, extentClockHours }, index) =>
      (kind === 'giant-tear' || kind === 'dialysis') && extentClockHours === undefined
        ? [
            {
              fields: [`breaks.found.${index}.extentClockHours`],
              message: `Break ${index + 1} is recorded as a ${labelOf('breaks.found.kind', kind)}; its extent in clock hours is not recorded.`,
            },
          ]
        : [],
    ),
  examples: {
    fires: [
      {
        name: 'giant tear',
        fields: 'breaks.found.0.extentClockHours',
        record: { breaks: { found: [{ kind: 'giant-tear', clock: 11 }] } },
      },
    ],
    silent: [
      {
        name: 'four hours',
        record: { breaks: { found: [{ kind: 'giant-tear', clock: 11, extentClockHours: 4 }] } },
      },
      { name: 'round hole', record: { breaks: { found: [{ kind: 'round-hole', clock: 11 }] } } },
    ],
    unknown: [{ name: 'kind not recorded', record: { breaks: { found: [{ clock: 11 }] } } }],
  },
});
