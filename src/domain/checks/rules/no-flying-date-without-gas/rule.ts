import { defineRule } from '../../define-rule.ts';
import { dateWords, gasOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'no-flying-date-without-gas',
  family: 'aftercare',
  level: 'caution',
  title: 'Flying is ruled out, and there is no gas in the eye',
  why: 'Either the tamponade or the advice is a slip, and the patient is held back from flying.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: true,
  unless: ['gas-advice-without-gas'],
  check: (record) => {
    const agent = record.tamponade?.agent;
    const until = record.aftercare?.noFlyingUntil;
    if (agent === undefined || gasOf(record) !== undefined || until === undefined) return [];
    return [
      {
        fields: ['aftercare.noFlyingUntil', 'tamponade.agent'],
        message: `Flying is ruled out until ${until === 'surgeon-confirms' ? labelOf('aftercare.noFlyingUntil', until) : dateWords(until)}; the tamponade is ${labelOf('tamponade.agent', agent)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'with oil',
        fields: 'aftercare.noFlyingUntil',
        record: { tamponade: { agent: 'silicone-oil' }, aftercare: { noFlyingUntil: 'surgeon-confirms' } },
      },
    ],
    silent: [
      {
        name: 'with gas',
        record: { tamponade: { agent: 'SF6' }, aftercare: { noFlyingUntil: 'surgeon-confirms' } },
      },
    ],
    unknown: [
      { name: 'tamponade not recorded', record: { aftercare: { noFlyingUntil: 'surgeon-confirms' } } },
    ],
  },
});
