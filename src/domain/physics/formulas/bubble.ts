import { globeOf } from '../../anatomy/globe.ts';
import { arcOfFill, capVolumeMl, cavityMl, coverDegrees, knownPositions } from '../bubble.ts';
import { axial, CAP, choice, clock, type Formula, mm, number, SPHERE } from './formula.ts';

/** Formulas of a bubble in the eye. */
export const bubbleFormulas: Readonly<Record<string, Formula>> = {
  'cavity-volume': {
    title: 'Volume of a cavity',
    formula: '4/3·πR³',
    unit: 'mL',
    source: SPHERE,
    inputs: [mm('radiusMm', 20, 10.5)],
    compute: ({ n }) => ({ value: cavityMl(n('radiusMm')) }),
  },
  'bubble-volume': {
    title: 'Volume of a bubble that touches an arc of wall',
    formula: 'V = πh²(3R − h)/3, h = R(1 − cos(θ/2))',
    unit: 'mL',
    source: CAP,
    inputs: [number('arcDegrees', '°', 0, 360), mm('radiusMm', 20, 10.5)],
    compute: ({ n }) => ({ value: capVolumeMl(n('arcDegrees'), n('radiusMm')) }),
  },
  'bubble-angle': {
    title: 'Arc of wall that a bubble of a volume touches',
    formula: 'the inverse of bubble-volume',
    unit: '°',
    source: CAP,
    inputs: [number('volumeMl', 'mL', 0, 20), mm('radiusMm', 20, 10.5)],
    compute: ({ n }) => ({ value: arcOfFill(Math.min(1, n('volumeMl') / cavityMl(n('radiusMm')))) }),
  },
  'bubble-fill-angle': {
    title: 'Arc of wall that a fill touches',
    formula: 'the inverse of V = πh²(3R − h)/3',
    unit: '°',
    source: CAP,
    inputs: [number('fillPercent', '%', 0, 100)],
    compute: ({ n }) => ({ value: arcOfFill(n('fillPercent') / 100) }),
  },
  'bubble-cover': {
    title: 'By how much a bubble covers a place on the wall; negative: not',
    formula: 'half the arc in contact − angle between the place and the highest point',
    unit: '°',
    source: CAP,
    inputs: [
      clock('clock'),
      mm('mmBehindLimbus'),
      number('fillPercent', '%', 0, 100),
      choice('position', knownPositions),
      axial,
      choice('buoyancy', ['floats', 'sinks'], 'floats'),
    ],
    compute: ({ n, s }) => {
      const position = knownPositions.find((one) => one === s('position'));
      if (position === undefined) return undefined;
      const place = { clock: n('clock'), mm: n('mmBehindLimbus') };
      const buoyancy = s('buoyancy') === 'sinks' ? 'sinks' : 'floats';
      const value = coverDegrees(
        globeOf(n('axialLengthMm')),
        place,
        n('fillPercent') / 100,
        position,
        buoyancy,
      );
      return value === undefined ? undefined : { value };
    },
  },
};
