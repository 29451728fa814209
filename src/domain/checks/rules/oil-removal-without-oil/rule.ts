import { defineRule } from '../../define-rule.ts';
import { labelOf, numberWords, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'oil-removal-without-oil',
  family: 'aftercare',
  level: 'contradiction',
  title: 'Removal of oil is planned, and there is no oil in the eye',
  why: 'The patient would be listed for an operation that nobody intends.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const months = record.aftercare?.oilRemovalInMonths;
    const agent = record.tamponade?.agent;
    if (months === undefined || agent === undefined || oilOf(record) !== undefined) return [];
    return [
      {
        fields: ['aftercare.oilRemovalInMonths', 'tamponade.agent'],
        message: `Removal of oil is planned in ${numberWords(months)} months; the tamponade is ${labelOf('tamponade.agent', agent)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'gas',
        fields: 'aftercare.oilRemovalInMonths',
        record: { tamponade: { agent: 'C3F8' }, aftercare: { oilRemovalInMonths: 4 } },
      },
    ],
    silent: [
      { name: 'oil', record: { tamponade: { agent: 'silicone-oil' }, aftercare: { oilRemovalInMonths: 4 } } },
    ],
    unknown: [{ name: 'tamponade not recorded', record: { aftercare: { oilRemovalInMonths: 4 } } }],
  },
});
