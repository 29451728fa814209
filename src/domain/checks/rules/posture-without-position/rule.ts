import { defineRule } from '../../define-rule.ts';
import { numberWords, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-without-position',
  family: 'posture',
  level: 'omission',
  title: 'A posture without its position',
  why: 'Hours and days without the position tell the patient nothing.',
  source: { text: 'Posture puts the break uppermost', certainty: 'C' },
  answerable: true,
  check: (record) =>
    posturesOf(record).flatMap(({ position, days, hoursADay }, index) =>
      position === undefined && (days !== undefined || hoursADay !== undefined)
        ? [
            {
              fields: [`aftercare.posture.${index}.position`],
              message: `A posture ${days === undefined ? `of ${numberWords(hoursADay ?? 0)} hours a day` : `for ${days} days`} is recorded without the position.`,
            },
          ]
        : [],
    ),
  examples: {
    fires: [
      {
        name: 'seven days of what',
        fields: 'aftercare.posture.0.position',
        record: { aftercare: { posture: [{ days: 7 }] } },
      },
    ],
    silent: [{ name: 'face down', record: { aftercare: { posture: [{ position: 'face-down', days: 7 }] } } }],
    unknown: [{ name: 'posture not recorded', record: { aftercare: { reviewInDays: 1 } } }],
  },
});
