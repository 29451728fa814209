import { defineRule } from '../../define-rule.ts';
import { labelOf, numberWords, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'oil-removal-far-off',
  family: 'aftercare',
  level: 'caution',
  title: 'Oil to come out unusually early or late',
  why: 'Oil that stays emulsifies; heavy oil is taken out sooner than light.',
  source: { text: 'Removal at a median 5.9 months: BMC Ophthalmol 2024 s12886-024-03618-z', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const months = record.aftercare?.oilRemovalInMonths;
    const oil = oilOf(record);
    if (months === undefined || oil === undefined) return [];
    const most = oil === 'heavy-oil' ? 6 : 18;
    if (months >= 0.5 && months <= most) return [];
    return [
      {
        fields: ['aftercare.oilRemovalInMonths'],
        message: `Removal of ${labelOf('tamponade.agent', oil)} is planned in ${numberWords(months)} months.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '60 months',
        fields: 'aftercare.oilRemovalInMonths',
        record: { tamponade: { agent: 'silicone-oil' }, aftercare: { oilRemovalInMonths: 60 } },
      },
    ],
    silent: [
      {
        name: 'six months',
        record: { tamponade: { agent: 'silicone-oil' }, aftercare: { oilRemovalInMonths: 6 } },
      },
    ],
    unknown: [{ name: 'tamponade not recorded', record: { aftercare: { oilRemovalInMonths: 60 } } }],
  },
});
