import { defineRule } from '../../define-rule.ts';
import { numberWords, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-hours-do-not-add-up',
  family: 'posture',
  level: 'caution',
  title: 'Postures of more than 24 hours a day',
  why: 'The patient cannot do it.',
  source: { text: 'A day has 24 hours', certainty: 'C' },
  answerable: true,
  check: (record) => {
    const postures = posturesOf(record);
    const hours = postures.reduce((sum, { hoursADay = 0 }) => sum + hoursADay, 0);
    const days = new Set(postures.map((one) => one.days));
    if (hours <= 24 || days.size > 1) return [];
    return [
      {
        fields: postures.map((_, index) => `aftercare.posture.${index}.hoursADay`),
        message: `The postures add up to ${numberWords(hours)} hours a day, if they are kept on the same days.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '16 and 16',
        fields: 'aftercare.posture.0.hoursADay',
        record: {
          aftercare: {
            posture: [
              { position: 'face-down', hoursADay: 16, days: 5 },
              { position: 'upright', hoursADay: 16, days: 5 },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: '16 and 8',
        record: {
          aftercare: {
            posture: [
              { position: 'face-down', hoursADay: 16, days: 5 },
              { position: 'upright', hoursADay: 8, days: 5 },
            ],
          },
        },
      },
    ],
    unknown: [
      { name: 'hours not recorded', record: { aftercare: { posture: [{ position: 'face-down' }] } } },
    ],
  },
});
