import { showClock } from '../../../anatomy/clock.ts';
import { globeOf } from '../../../anatomy/globe.ts';
import { coverDegrees } from '../../../physics/bubble.ts';
import { layBreak } from '../../../physics/support.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, elementsOf, labelOf, listWords, posturesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'posture-leaves-break-dry',
  family: 'posture',
  level: 'caution',
  title: 'In no posture does the bubble touch a break that nothing else supports',
  why: 'A break that the bubble never touches is not closed by it.',
  source: { text: 'Posture puts the break uppermost; cap of a sphere', certainty: 'C' },
  answerable: true,
  check: (record) => {
    const eye = record.who?.eye;
    const agent = record.tamponade?.agent;
    const postures = posturesOf(record);
    if (eye === undefined || agent === undefined || agent === 'none' || postures.length === 0) return [];
    const positions = postures.flatMap(({ position }) => (position === undefined ? [] : [position]));
    if (positions.length < postures.length || positions.includes('free')) return [];
    const globe = globeOf(record.before?.axialLengthMm);
    // Where no fill is recorded, a full one is taken, so that only what no bubble could reach is named.
    const fill =
      (record.tamponade?.fillPercent ?? (record.tamponade?.exchange === 'injection' ? 30 : 90)) / 100;
    return breaksOf(record).flatMap((found, index) => {
      const lying = layBreak(found, globe, eye);
      const bare = found.supportedByElements === 'none' || elementsOf(record).length === 0;
      if (lying === undefined || !bare || found.onDetachedRetina === false) return [];
      const place = { clock: lying.clock, mm: (lying.frontMm + lying.backMm) / 2 };
      const covers = positions.map(
        (position) =>
          coverDegrees(globe, place, fill, position, agent === 'heavy-oil' ? 'sinks' : 'floats') ?? 0,
      );
      if (covers.some((cover) => cover > -12)) return [];
      const names = listWords(positions.map((position) => labelOf('aftercare.posture.position', position)));
      const message = `With the head ${names}, a fill of ${Math.round(fill * 100)}% does not reach break ${index + 1} at ${showClock(lying.clock)} (an estimate).`;
      return [{ fields: ['aftercare.posture.0.position', `breaks.found.${index}.clock`], message }];
    });
  },
  examples: {
    fires: [
      {
        name: 'lower break, upright, half full',
        fields: 'aftercare.posture.0.position',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ clock: 6, zone: 'equator' }] },
          tamponade: { agent: 'SF6', fillPercent: 50 },
          aftercare: { posture: [{ position: 'upright', days: 5 }] },
        },
      },
    ],
    silent: [
      {
        name: 'upper break, upright',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ clock: 12, zone: 'equator' }] },
          tamponade: { agent: 'SF6', fillPercent: 50 },
          aftercare: { posture: [{ position: 'upright' }] },
        },
      },
      {
        name: 'on an element',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ clock: 6, zone: 'equator', supportedByElements: [1] }] },
          buckle: { elements: [{ role: 'encircling' }] },
          tamponade: { agent: 'SF6', fillPercent: 50 },
          aftercare: { posture: [{ position: 'upright' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'clock hour not recorded',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ zone: 'equator' }] },
          tamponade: { agent: 'SF6', fillPercent: 50 },
          aftercare: { posture: [{ position: 'upright' }] },
        },
      },
    ],
  },
});
