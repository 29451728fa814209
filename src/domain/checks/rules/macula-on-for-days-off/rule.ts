import { defineRule } from '../../define-rule.ts';
import { numberIn } from '../../facts.ts';

export const rule = defineRule({
  id: 'macula-on-for-days-off',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'The macula is on and has been off for days',
  why: 'How long the macula was off is what the patient’s sight depends on.',
  source: { text: 'Macula: on, off, split', certainty: 'R' },
  answerable: false,
  check: ({ before }) => {
    const days = numberIn(before?.maculaOffDays);
    if (before?.macula !== 'on' || days === undefined || days === 0) return [];
    return [
      {
        fields: ['before.maculaOffDays', 'before.macula'],
        message: `The macula is recorded as on and as off for ${days} days.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'on and off',
        fields: 'before.maculaOffDays',
        record: { before: { macula: 'on', maculaOffDays: 4 } },
      },
    ],
    silent: [{ name: 'off for four days', record: { before: { macula: 'off', maculaOffDays: 4 } } }],
    unknown: [{ name: 'macula not recorded', record: { before: { maculaOffDays: 4 } } }],
  },
});
