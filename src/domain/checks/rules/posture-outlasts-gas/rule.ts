import { gasFacts } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { gasOf, labelOf, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-outlasts-gas',
  family: 'posture',
  level: 'caution',
  title: 'A posture for longer than the gas lasts, or for more than three weeks',
  why: 'A day or two to a week or two is usual; the rest is a burden without a bubble.',
  source: { text: 'How long each gas lasts: safety alert, 18 December 2018', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const gas = gasOf(record);
    const agent = record.tamponade?.agent;
    if (agent === undefined || agent === 'none') return [];
    const most = gas === undefined ? 42 : Math.min(21, gasFacts[gas].lastsDays[1] + 1);
    return posturesOf(record).flatMap(({ days, position }, index) =>
      days === undefined || position === undefined || position === 'free' || days <= most
        ? []
        : [
            {
              fields: [`aftercare.posture.${index}.days`],
              message: `The posture, ${labelOf('aftercare.posture.position', position)}, is recorded for ${days} days with ${labelOf('tamponade.agent', agent)}.`,
            },
          ],
    );
  },
  examples: {
    fires: [
      {
        name: '30 days',
        fields: 'aftercare.posture.0.days',
        record: {
          tamponade: { agent: 'SF6' },
          aftercare: { posture: [{ position: 'face-down', days: 30 }] },
        },
      },
    ],
    silent: [
      {
        name: 'a week',
        record: { tamponade: { agent: 'SF6' }, aftercare: { posture: [{ position: 'face-down', days: 7 }] } },
      },
    ],
    unknown: [
      {
        name: 'tamponade not recorded',
        record: { aftercare: { posture: [{ position: 'face-down', days: 30 }] } },
      },
    ],
  },
});
