import { defineRule } from '../../define-rule.ts';
import { gasOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'nitrous-oxide-not-recorded',
  family: 'medicines',
  level: 'omission',
  title: 'General anaesthesia with gas in the eye, and nothing said of nitrous oxide',
  why: 'Nitrous oxide swells the bubble, and leaves it too small when it goes.',
  source: { text: 'Stop 15 minutes before gas', certainty: 'R2' },
  answerable: true,
  check: (record) => {
    const gas = gasOf(record);
    if (
      gas === undefined ||
      record.anaesthesia?.kind !== 'general' ||
      record.anaesthesia.nitrousOxideUsed !== undefined
    )
      return [];
    if (record.anaesthesia.nitrousOxideStoppedAt !== undefined) return [];
    return [
      {
        fields: ['anaesthesia.nitrousOxideUsed'],
        message: `Anaesthesia was general and ${gas} was left in the eye; whether nitrous oxide was used is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'not said',
        fields: 'anaesthesia.nitrousOxideUsed',
        record: { anaesthesia: { kind: 'general' }, tamponade: { agent: 'SF6' } },
      },
    ],
    silent: [
      {
        name: 'not used',
        record: { anaesthesia: { kind: 'general', nitrousOxideUsed: false }, tamponade: { agent: 'SF6' } },
      },
      { name: 'block', record: { anaesthesia: { kind: 'sub-tenon' }, tamponade: { agent: 'SF6' } } },
    ],
    unknown: [{ name: 'tamponade not recorded', record: { anaesthesia: { kind: 'general' } } }],
  },
});
