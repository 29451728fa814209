import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-as-large-as-giant-tear',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A tear or hole of three clock hours or more that is not called a giant tear',
  why: 'A giant tear is another operation, another prognosis and another code.',
  source: {
    text: 'Giant tear: 90° or more (3 clock hours) with posterior vitreous detachment; a dialysis is not one',
    certainty: 'R',
  },
  answerable: false,
  check: (record) =>
    breaksOf(record).flatMap(({ kind, extentClockHours }, index) => {
      if (extentClockHours === undefined || extentClockHours < 3) return [];
      if (kind !== 'horseshoe' && kind !== 'round-hole' && kind !== 'operculated') return [];
      return [
        {
          fields: [`breaks.found.${index}.extentClockHours`, `breaks.found.${index}.kind`],
          message: `Break ${index + 1} is recorded as a ${labelOf('breaks.found.kind', kind)} and extends over ${numberWords(extentClockHours)} clock hours; from 3 clock hours it is a giant tear.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'horseshoe of four hours',
        fields: 'breaks.found.0.extentClockHours',
        record: { breaks: { found: [{ kind: 'horseshoe', extentClockHours: 4 }] } },
      },
    ],
    silent: [
      {
        name: 'large horseshoe tear',
        record: { breaks: { found: [{ kind: 'horseshoe', extentClockHours: 2 }] } },
      },
      {
        name: 'dialysis of four hours',
        record: { breaks: { found: [{ kind: 'dialysis', extentClockHours: 4 }] } },
      },
    ],
    unknown: [{ name: 'kind not recorded', record: { breaks: { found: [{ extentClockHours: 4 }] } } }],
  },
});
