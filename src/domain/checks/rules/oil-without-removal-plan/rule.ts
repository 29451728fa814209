import { defineRule } from '../../define-rule.ts';
import { labelOf, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'oil-without-removal-plan',
  family: 'aftercare',
  level: 'omission',
  title: 'Silicone oil without a plan for its removal',
  why: 'Oil that is forgotten emulsifies and harms cornea and pressure.',
  source: { text: 'Removal at a median 5.9 months: BMC Ophthalmol 2024 s12886-024-03618-z', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const oil = oilOf(record);
    const { oilRemovalInMonths, nextOperationOn } = record.aftercare ?? {};
    if (oil === undefined || oilRemovalInMonths !== undefined || nextOperationOn !== undefined) return [];
    return [
      {
        fields: ['aftercare.oilRemovalInMonths'],
        message: `${labelOf('tamponade.agent', oil).replace(/^./, (c) => c.toUpperCase())} is left in the eye; no plan for its removal is recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no plan',
        fields: 'aftercare.oilRemovalInMonths',
        record: { tamponade: { agent: 'silicone-oil' } },
      },
    ],
    silent: [
      {
        name: 'in four months',
        record: { tamponade: { agent: 'silicone-oil' }, aftercare: { oilRemovalInMonths: 4 } },
      },
    ],
    unknown: [{ name: 'gas', record: { tamponade: { agent: 'SF6' } } }],
  },
});
