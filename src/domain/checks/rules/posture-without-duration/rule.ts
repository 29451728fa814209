import { defineRule } from '../../define-rule.ts';
import { labelOf, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-without-duration',
  family: 'posture',
  level: 'omission',
  title: 'A posture without its duration',
  why: 'Patients ask how long; whoever answers the telephone reads it here.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    posturesOf(record).flatMap(({ position, days }, index) =>
      position === undefined || position === 'free' || days !== undefined
        ? []
        : [
            {
              fields: [`aftercare.posture.${index}.days`],
              message: `The posture, ${labelOf('aftercare.posture.position', position)}, is recorded without for how long.`,
            },
          ],
    ),
  examples: {
    fires: [
      {
        name: 'no days',
        fields: 'aftercare.posture.0.days',
        record: { aftercare: { posture: [{ position: 'face-down' }] } },
      },
    ],
    silent: [{ name: 'five days', record: { aftercare: { posture: [{ position: 'face-down', days: 5 }] } } }],
    unknown: [{ name: 'no position', record: { aftercare: { posture: [{ hoursADay: 8 }] } } }],
  },
});
