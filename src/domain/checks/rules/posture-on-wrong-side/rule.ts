import { hoursApart, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, elementsOf, gasOf, labelOf, listWords, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-on-wrong-side',
  family: 'posture',
  level: 'contradiction',
  title: 'Lying on the side that puts the only break lowermost',
  why: 'Right eye temporal: on the left side. Left eye temporal: on the right side. The other way round the bubble floats away from the break.',
  source: { text: 'Posture puts the break uppermost', certainty: 'C' },
  answerable: false,
  check: (record) => {
    const agent = record.tamponade?.agent;
    const postures = posturesOf(record);
    const positions = postures.map(({ position }) => position);
    const floats = gasOf(record) !== undefined || agent === 'silicone-oil';
    const clocks = breaksOf(record).map(({ clock }) => clock);
    if (!floats || positions.length !== 1 || clocks.length === 0 || clocks.includes(undefined)) return [];
    const [position] = positions;
    // The patient's right is the surgeon's left: on the right side, 3 o'clock is uppermost.
    const uppermost = position === 'right-side' ? 3 : position === 'left-side' ? 9 : undefined;
    if (uppermost === undefined || position === undefined || elementsOf(record).length > 0) return [];
    const wrong = clocks.every((clock = 12) => hoursApart(clock, uppermost) >= 4.5);
    if (!wrong) return [];
    const places = listWords(clocks.map((clock = 12) => showClock(clock)));
    const message = `With the patient ${labelOf('aftercare.posture.position', position)}, ${showClock(uppermost)} is uppermost; the break is at ${places}.`;
    return [{ fields: ['aftercare.posture.0.position', 'breaks.found.0.clock'], message }];
  },
  examples: {
    fires: [
      {
        name: 'left eye, 3 o’clock, left side',
        fields: 'aftercare.posture.0.position',
        record: {
          breaks: { found: [{ clock: 3 }] },
          tamponade: { agent: 'SF6' },
          aftercare: { posture: [{ position: 'left-side' }] },
        },
      },
    ],
    silent: [
      {
        name: 'left eye, 3 o’clock, right side',
        record: {
          breaks: { found: [{ clock: 3 }] },
          tamponade: { agent: 'SF6' },
          aftercare: { posture: [{ position: 'right-side' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'no clock hour',
        record: {
          breaks: { found: [{ kind: 'horseshoe' }] },
          tamponade: { agent: 'SF6' },
          aftercare: { posture: [{ position: 'left-side' }] },
        },
      },
    ],
  },
});
