import { defineRule } from '../../define-rule.ts';
import { gasOf, labelOf, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'flat-on-back-with-gas',
  family: 'posture',
  level: 'caution',
  title: 'Flat on the back with gas in the eye',
  why: 'On the back the bubble lies against the lens and can block the pupil.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  unless: ['posture-leaves-break-dry'],
  check: (record) => {
    const index = posturesOf(record).findIndex(({ position }) => position === 'supine');
    const gas = gasOf(record);
    if (gas === undefined || index < 0) return [];
    return [
      {
        fields: [`aftercare.posture.${index}.position`, 'tamponade.agent'],
        message: `The posture is ${labelOf('aftercare.posture.position', 'supine')}, with ${gas} in the eye.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'on the back',
        fields: 'aftercare.posture.0.position',
        record: { tamponade: { agent: 'SF6' }, aftercare: { posture: [{ position: 'supine' }] } },
      },
    ],
    silent: [
      {
        name: 'on the back under heavy oil',
        record: { tamponade: { agent: 'heavy-oil' }, aftercare: { posture: [{ position: 'supine' }] } },
      },
      {
        name: 'head up',
        record: { tamponade: { agent: 'SF6' }, aftercare: { posture: [{ position: 'supine-head-up-45' }] } },
      },
    ],
    unknown: [
      { name: 'tamponade not recorded', record: { aftercare: { posture: [{ position: 'supine' }] } } },
    ],
  },
});
