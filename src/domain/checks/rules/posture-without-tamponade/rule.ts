import { defineRule } from '../../define-rule.ts';
import { labelOf, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-without-tamponade',
  family: 'posture',
  level: 'caution',
  title: 'A posture, and no tamponade to place',
  why: 'Posture places a bubble; without one it is unusual and a burden.',
  source: { text: 'Posture puts the break uppermost', certainty: 'C' },
  answerable: true,
  check: (record) => {
    const index = posturesOf(record).findIndex(
      ({ position }) => position !== undefined && position !== 'free',
    );
    if (record.tamponade?.agent !== 'none' || index < 0 || record.vitreous?.heavyLiquid === 'left') return [];
    return [
      {
        fields: [`aftercare.posture.${index}.position`, 'tamponade.agent'],
        message: `The posture is ${labelOf('aftercare.posture.position', posturesOf(record)[index]?.position ?? '')}; the tamponade is recorded as none.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'face down without gas',
        fields: 'aftercare.posture.0.position',
        record: { tamponade: { agent: 'none' }, aftercare: { posture: [{ position: 'face-down' }] } },
      },
    ],
    silent: [
      {
        name: 'no position needed',
        record: { tamponade: { agent: 'none' }, aftercare: { posture: [{ position: 'free' }] } },
      },
      {
        name: 'gas',
        record: { tamponade: { agent: 'SF6' }, aftercare: { posture: [{ position: 'face-down' }] } },
      },
    ],
    unknown: [
      { name: 'tamponade not recorded', record: { aftercare: { posture: [{ position: 'face-down' }] } } },
    ],
  },
});
