import { hoursApart, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, gasOf, labelOf, listWords, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'lower-breaks-light-tamponade-upright',
  family: 'posture',
  level: 'caution',
  title: 'Breaks below, a light tamponade, upright and no buckle',
  why: 'Lower breaks do worse with vitrectomy alone than with a band, and a floating bubble leaves them in an upright head.',
  source: { text: 'Inferior breaks do worse with vitrectomy alone than with a band added', certainty: 'P' },
  answerable: true,
  unless: ['posture-leaves-break-dry'],
  check: (record) => {
    const positions = posturesOf(record).map(({ position }) => position);
    const light = gasOf(record) !== undefined || record.tamponade?.agent === 'silicone-oil';
    if (
      !light ||
      record.buckle?.elements !== 'none' ||
      positions.length === 0 ||
      positions.some((one) => one !== 'upright')
    )
      return [];
    const low = breaksOf(record).flatMap(({ clock, onDetachedRetina }) =>
      clock !== undefined && onDetachedRetina !== false && hoursApart(clock, 6) <= 2 ? [clock] : [],
    );
    if (low.length === 0) return [];
    return [
      {
        fields: ['aftercare.posture.0.position', 'breaks.found'],
        message: `Breaks at ${listWords(low.map(showClock))} with ${labelOf('tamponade.agent', record.tamponade?.agent ?? '')}, the head upright and no buckle.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'break at 6',
        fields: 'aftercare.posture.0.position',
        record: {
          breaks: { found: [{ clock: 6 }] },
          buckle: { elements: 'none' },
          tamponade: { agent: 'SF6' },
          aftercare: { posture: [{ position: 'upright' }] },
        },
      },
    ],
    silent: [
      {
        name: 'face down as well',
        record: {
          breaks: { found: [{ clock: 6 }] },
          buckle: { elements: 'none' },
          tamponade: { agent: 'SF6' },
          aftercare: { posture: [{ position: 'upright' }, { position: 'face-down' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'buckle not recorded',
        record: {
          breaks: { found: [{ clock: 6 }] },
          tamponade: { agent: 'SF6' },
          aftercare: { posture: [{ position: 'upright' }] },
        },
      },
    ],
  },
});
