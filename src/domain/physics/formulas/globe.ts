import { arcHours, quadrantAt } from '../../anatomy/clock.ts';
import { circumferenceMm, defaults, equatorMm, globeOf, parallelMm, poleMm } from '../../anatomy/globe.ts';
import { insertionMm, oraRangeMm } from '../../anatomy/insertions.ts';
import { distanceMm, hourMm } from '../../anatomy/surface.ts';
import { asEye, axial, clock, eye, type Formula, mm, SPHERE, TILLAUX } from './formula.ts';

/** Formulas of the globe and its landmarks. */
export const globeFormulas: Readonly<Record<string, Formula>> = {
  'globe-circumference': {
    title: 'Circumference of the globe at the equator',
    formula: '2πR',
    unit: 'mm',
    source: SPHERE,
    inputs: [axial],
    compute: ({ n }) => ({ value: circumferenceMm(globeOf(n('axialLengthMm'))) }),
  },
  'equator-arc': {
    title: 'Equator behind the limbus',
    formula: 'R·(π/2 − θ0)',
    unit: 'mm',
    source: SPHERE,
    inputs: [axial, mm('limbusRadiusMm', 8, defaults.limbusRadiusMm)],
    compute: ({ n }) => ({ value: equatorMm(globeOf(n('axialLengthMm'), n('limbusRadiusMm'))) }),
  },
  'pole-arc': {
    title: 'Posterior pole behind the limbus',
    formula: 'R·(π − θ0)',
    unit: 'mm',
    source: SPHERE,
    inputs: [axial],
    compute: ({ n }) => ({ value: poleMm(globeOf(n('axialLengthMm'))) }),
  },
  'parallel-circumference': {
    title: 'Circumference of the parallel at an arc behind the limbus',
    formula: '2πR·sin(θ0 + s/R)',
    unit: 'mm',
    source: SPHERE,
    inputs: [mm('arcMm'), axial, mm('limbusRadiusMm', 8, defaults.limbusRadiusMm)],
    compute: ({ n }) => ({ value: parallelMm(globeOf(n('axialLengthMm'), n('limbusRadiusMm')), n('arcMm')) }),
  },
  'clock-hour-width': {
    title: 'Breadth of one clock hour at an arc behind the limbus',
    formula: '2πR·sin(θ0 + s/R)/12',
    unit: 'mm',
    source: SPHERE,
    inputs: [mm('arcMm'), axial],
    compute: ({ n }) => ({ value: hourMm(globeOf(n('axialLengthMm')), n('arcMm')) }),
  },
  'insertion-distance': {
    title: 'Line of the insertions behind the limbus',
    formula: 'Insertions joined round the clock by half cosines',
    unit: 'mm',
    source: TILLAUX,
    inputs: [clock('clock'), eye],
    compute: ({ n, s }) => ({ value: insertionMm(n('clock'), asEye(s('eye'))) }),
  },
  'ora-range': {
    title: 'Ora serrata behind the limbus',
    formula: 'Nasal 5–7.5 mm, temporal 7–8.5 mm, interpolated',
    unit: 'mm',
    source: 'Two texts that disagree (read)',
    inputs: [clock('clock'), eye],
    compute: ({ n, s }) => {
      const [low, high] = oraRangeMm(n('clock'), asEye(s('eye')));
      return { low, high };
    },
  },
  'clock-quadrant': {
    title: 'Quadrant of a clock hour',
    formula: 'Temporal is 9 o’clock in a right eye, 3 o’clock in a left',
    unit: '',
    source: 'Common practice',
    inputs: [clock('clock'), eye],
    compute: ({ n, s }) => ({ value: quadrantAt(n('clock'), asEye(s('eye'))) }),
  },
  'arc-hours': {
    title: 'Length of an arc clockwise',
    formula: '(to − from) mod 12',
    unit: 'clock hours',
    source: 'Computed',
    inputs: [clock('fromClock'), clock('toClock')],
    compute: ({ n }) => ({ value: arcHours({ from: n('fromClock'), to: n('toClock') }) }),
  },
  'great-circle': {
    title: 'Shortest way along the wall between two places',
    formula: 'R·arccos(a·b)',
    unit: 'mm',
    source: SPHERE,
    inputs: [clock('fromClock'), mm('fromMm'), clock('toClock'), mm('toMm'), axial],
    compute: ({ n }) => ({
      value: distanceMm(
        globeOf(n('axialLengthMm')),
        { clock: n('fromClock'), mm: n('fromMm') },
        { clock: n('toClock'), mm: n('toMm') },
      ),
    }),
  },
};
