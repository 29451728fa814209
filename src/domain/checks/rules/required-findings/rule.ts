import { defineRule } from '../../define-rule.ts';
import { breaksOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-findings',
  family: 'standards',
  level: 'omission',
  title: 'Breaks found, or that there were none, are not recorded',
  why: 'Each finding belongs in the note; “none found” is a finding.',
  source: { text: 'RC.02.01.03; C-CDA Operative Note: findings 59776-5', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const found = record.breaks?.found;
    if (found === undefined)
      return [{ fields: ['breaks.found'], message: 'Not recorded: the breaks, or that none was found.' }];
    const bare = breaksOf(record).flatMap(({ kind, clock }, index) => [
      ...(kind === undefined
        ? [{ field: `breaks.found.${index}.kind`, what: `the kind of break ${index + 1}` }]
        : []),
      ...(clock === undefined && kind !== 'macular-hole'
        ? [{ field: `breaks.found.${index}.clock`, what: `the clock hour of break ${index + 1}` }]
        : []),
    ]);
    if (bare.length === 0) return [];
    return [
      {
        fields: bare.map(({ field }) => field),
        message: `Not recorded: ${listWords(bare.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'nothing', fields: 'breaks.found', record: {} }],
    silent: [{ name: 'none found', record: { breaks: { found: 'none' } } }],
    unknown: [],
  },
});
