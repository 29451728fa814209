import { defineRule } from '../../define-rule.ts';
import { dateWords, minutesBetween } from '../../facts.ts';

export const rule = defineRule({
  id: 'nitrous-oxide-stopped-outside-operation',
  family: 'time',
  level: 'contradiction',
  title: 'Nitrous oxide stopped on another day, or stopped and never used',
  why: 'Whether nitrous oxide met the gas is read from this time.',
  source: { text: 'Stop 15 minutes before gas', certainty: 'R2' },
  answerable: false,
  check: (record) => {
    const { nitrousOxideStoppedAt: stopped, nitrousOxideUsed } = record.anaesthesia ?? {};
    const start = record.who?.startedAt;
    if (stopped === undefined || stopped === 'not-applicable') return [];
    const when = `${stopped.slice(11)} on ${dateWords(stopped)}`;
    if (nitrousOxideUsed === false) {
      return [
        {
          fields: ['anaesthesia.nitrousOxideUsed', 'anaesthesia.nitrousOxideStoppedAt'],
          message: `Nitrous oxide is recorded as not used, and as stopped at ${when}.`,
        },
      ];
    }
    if (start === undefined || Math.abs(minutesBetween(start, stopped)) <= 12 * 60) return [];
    return [
      {
        fields: ['anaesthesia.nitrousOxideStoppedAt', 'who.startedAt'],
        message: `Nitrous oxide is recorded as stopped at ${when}; the operation began at ${start.slice(11)} on ${dateWords(start)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'another day',
        fields: 'anaesthesia.nitrousOxideStoppedAt',
        record: {
          who: { startedAt: '2026-03-02T09:00' },
          anaesthesia: { nitrousOxideUsed: true, nitrousOxideStoppedAt: '2026-03-12T09:20' },
        },
      },
      {
        name: 'never used',
        fields: 'anaesthesia.nitrousOxideUsed',
        record: { anaesthesia: { nitrousOxideUsed: false, nitrousOxideStoppedAt: '2026-03-02T09:20' } },
      },
    ],
    silent: [
      {
        name: 'in the operation',
        record: {
          who: { startedAt: '2026-03-02T09:00' },
          anaesthesia: { nitrousOxideUsed: true, nitrousOxideStoppedAt: '2026-03-02T09:20' },
        },
      },
    ],
    unknown: [
      {
        name: 'start not recorded',
        record: { anaesthesia: { nitrousOxideUsed: true, nitrousOxideStoppedAt: '2026-03-12T09:20' } },
      },
    ],
  },
});
