import { defineRule } from '../../define-rule.ts';
import { labelOf, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-of-no-time',
  family: 'posture',
  level: 'contradiction',
  title: 'A posture for no time at all',
  why: 'The patient reads a position and a nought.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) =>
    posturesOf(record).flatMap(({ position, hoursADay, minutesAnHour, days }, index) => {
      if (position === undefined || position === 'free') return [];
      const nought = [
        { field: 'hoursADay', value: hoursADay, what: '0 hours a day' },
        { field: 'minutesAnHour', value: minutesAnHour, what: '0 minutes of each hour' },
        { field: 'days', value: days, what: '0 days' },
      ].find(({ value }) => value === 0);
      if (nought === undefined) return [];
      return [
        {
          fields: [`aftercare.posture.${index}.${nought.field}`],
          message: `The posture, ${labelOf('aftercare.posture.position', position)}, is recorded for ${nought.what}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'no day',
        fields: 'aftercare.posture.0.days',
        record: { aftercare: { posture: [{ position: 'face-down', days: 0 }] } },
      },
    ],
    silent: [
      { name: 'a week', record: { aftercare: { posture: [{ position: 'face-down', days: 7 }] } } },
      {
        name: 'no position needed',
        record: { aftercare: { posture: [{ position: 'free', hoursADay: 0 }] } },
      },
    ],
    unknown: [{ name: 'position not recorded', record: { aftercare: { posture: [{ days: 0 }] } } }],
  },
});
