import { defineRule } from '../../define-rule.ts';
import { labelOf, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'heavy-oil-face-down',
  family: 'posture',
  level: 'caution',
  title: 'A posture for a light tamponade under heavy oil',
  why: 'Heavy oil sinks: face down it leaves the back of the eye.',
  source: { text: 'Heavier than water from about 1.06', certainty: 'M' },
  answerable: true,
  check: (record) => {
    const index = posturesOf(record).findIndex(
      ({ position }) => position === 'face-down' || position === 'right-cheek' || position === 'left-cheek',
    );
    if (record.tamponade?.agent !== 'heavy-oil' || index < 0) return [];
    const position = posturesOf(record)[index]?.position ?? '';
    return [
      {
        fields: [`aftercare.posture.${index}.position`, 'tamponade.agent'],
        message: `Heavy silicone oil is left in the eye; the posture is ${labelOf('aftercare.posture.position', position)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'face down',
        fields: 'aftercare.posture.0.position',
        record: { tamponade: { agent: 'heavy-oil' }, aftercare: { posture: [{ position: 'face-down' }] } },
      },
    ],
    silent: [
      {
        name: 'on the back',
        record: { tamponade: { agent: 'heavy-oil' }, aftercare: { posture: [{ position: 'supine' }] } },
      },
    ],
    unknown: [
      { name: 'agent not recorded', record: { aftercare: { posture: [{ position: 'face-down' }] } } },
    ],
  },
});
