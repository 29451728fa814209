import { defineRule } from '../../define-rule.ts';
import { gasOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'nitrous-oxide-and-gas',
  family: 'medicines',
  level: 'omission',
  title: 'Nitrous oxide was used with gas, and when it was stopped is not recorded',
  why: 'Nitrous oxide swells the bubble, and leaves it too small when it goes.',
  source: { text: 'Stop 15 minutes before gas', certainty: 'R2' },
  answerable: true,
  check: (record) => {
    const { nitrousOxideUsed, nitrousOxideStoppedAt } = record.anaesthesia ?? {};
    if (gasOf(record) === undefined || nitrousOxideUsed !== true) return [];
    if (nitrousOxideStoppedAt !== undefined && nitrousOxideStoppedAt !== 'not-applicable') return [];
    return [
      {
        fields: ['anaesthesia.nitrousOxideStoppedAt'],
        message: 'Nitrous oxide was used and gas left in the eye; when it was stopped is not recorded.',
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'not recorded',
        fields: 'anaesthesia.nitrousOxideStoppedAt',
        record: { anaesthesia: { nitrousOxideUsed: true }, tamponade: { agent: 'SF6' } },
      },
    ],
    silent: [
      {
        name: 'stopped',
        record: {
          anaesthesia: { nitrousOxideUsed: true, nitrousOxideStoppedAt: '2026-12-01T10:20' },
          tamponade: { agent: 'SF6' },
        },
      },
    ],
    unknown: [{ name: 'use not recorded', record: { tamponade: { agent: 'SF6' } } }],
  },
});
