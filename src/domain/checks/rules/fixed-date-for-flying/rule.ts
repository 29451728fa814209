import { defineRule } from '../../define-rule.ts';
import { dateWords, gasOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'fixed-date-for-flying',
  family: 'aftercare',
  level: 'caution',
  title: 'A fixed date for flying',
  why: 'Gas can last longer than expected; only an eye without gas may fly.',
  source: { text: 'No flying until the gas has gone: safety alert 2018', certainty: 'R' },
  answerable: true,
  unless: ['flying-before-gas-gone'],
  check: (record) => {
    const until = record.aftercare?.noFlyingUntil;
    if (gasOf(record) === undefined || until === undefined || until === 'surgeon-confirms') return [];
    return [
      {
        fields: ['aftercare.noFlyingUntil'],
        message: `Flying is ruled out until ${dateWords(until)}; the note and letters say “until the surgeon has confirmed that the gas has gone”.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'a date',
        fields: 'aftercare.noFlyingUntil',
        record: { tamponade: { agent: 'SF6' }, aftercare: { noFlyingUntil: '2027-03-01' } },
      },
    ],
    silent: [
      {
        name: 'the surgeon confirms',
        record: { tamponade: { agent: 'SF6' }, aftercare: { noFlyingUntil: 'surgeon-confirms' } },
      },
    ],
    unknown: [{ name: 'not recorded', record: { tamponade: { agent: 'SF6' } } }],
  },
});
