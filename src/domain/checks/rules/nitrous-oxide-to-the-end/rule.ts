import { defineRule } from '../../define-rule.ts';
import { gasOf, minutesBetween } from '../../facts.ts';

export const rule = defineRule({
  id: 'nitrous-oxide-to-the-end',
  family: 'medicines',
  level: 'contradiction',
  title: 'Nitrous oxide ran until the operation was over, with gas in the eye',
  why: 'Gas goes in before the end; nitrous oxide has to be off 15 minutes before it.',
  source: { text: 'Stop 15 minutes before gas', certainty: 'R2' },
  answerable: false,
  check: (record) => {
    const stopped = record.anaesthesia?.nitrousOxideStoppedAt;
    const ended = record.who?.endedAt;
    if (
      gasOf(record) === undefined ||
      stopped === undefined ||
      stopped === 'not-applicable' ||
      ended === undefined
    )
      return [];
    const minutes = minutesBetween(stopped, ended);
    if (minutes >= 15) return [];
    const message = `Nitrous oxide was stopped at ${stopped.slice(11)} and the operation ended at ${ended.slice(11)}; gas was left in the eye.`;
    return [{ fields: ['anaesthesia.nitrousOxideStoppedAt', 'who.endedAt'], message }];
  },
  examples: {
    fires: [
      {
        name: 'five minutes before the end',
        fields: 'anaesthesia.nitrousOxideStoppedAt',
        record: {
          who: { endedAt: '2026-12-01T11:00' },
          anaesthesia: { nitrousOxideStoppedAt: '2026-12-01T10:55' },
          tamponade: { agent: 'SF6' },
        },
      },
    ],
    silent: [
      {
        name: 'half an hour before',
        record: {
          who: { endedAt: '2026-12-01T11:00' },
          anaesthesia: { nitrousOxideStoppedAt: '2026-12-01T10:30' },
          tamponade: { agent: 'SF6' },
        },
      },
    ],
    unknown: [
      {
        name: 'end not recorded',
        record: { anaesthesia: { nitrousOxideStoppedAt: '2026-12-01T10:55' }, tamponade: { agent: 'SF6' } },
      },
    ],
  },
});
