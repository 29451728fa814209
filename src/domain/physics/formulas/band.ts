import { globeOf } from '../../anatomy/globe.ts';
import { insertionMm } from '../../anatomy/insertions.ts';
import { curveLengthMm, heightFromShortening, overlapMm, shorteningForHeight } from '../band.ts';
import { opticsDefaults, shiftFromLengthening } from '../refraction.ts';
import { strengthLeft } from '../sutures.ts';
import { asEye, axial, choice, eye, type Formula, mm, number, SPHERE, TILLAUX } from './formula.ts';

/** Formulas of bands, sutures and refraction. */
export const bandFormulas: Readonly<Record<string, Formula>> = {
  'shortening-height': {
    title: 'Height of a shortened band, at most',
    formula: 'h = ΔL/2π',
    unit: 'mm',
    source: 'IOVS abstract 2357577 (read)',
    inputs: [mm('shorteningMm', 80)],
    compute: ({ n }) => ({ value: heightFromShortening(n('shorteningMm')) }),
  },
  'height-shortening': {
    title: 'Shortening that a height needs at least',
    formula: 'ΔL = 2πh',
    unit: 'mm',
    source: 'IOVS abstract 2357577 (read)',
    inputs: [mm('heightMm', 10)],
    compute: ({ n }) => ({ value: shorteningForHeight(n('heightMm')) }),
  },
  'band-length': {
    title: 'Length round the globe at a place behind the insertions',
    formula: '∮ √((R dθ)² + (R·sin θ dφ)²)',
    unit: 'mm',
    source: `${TILLAUX}; ${SPHERE}`,
    inputs: [mm('frontEdgeMm', 20), mm('widthMm', 15, 0), axial, eye],
    compute: ({ n, s }) => ({
      value: curveLengthMm(
        globeOf(n('axialLengthMm')),
        (at) => insertionMm(at, asEye(s('eye'))) + n('frontEdgeMm') + n('widthMm') / 2,
        { from: 6, to: 6 },
      ),
    }),
  },
  'band-overlap': {
    title: 'Overlap of the ends of a band',
    formula: 'length − (length round the globe − shortening)',
    unit: 'mm',
    source: 'Computed',
    inputs: [mm('lengthMm', 200), mm('roundMm', 200), mm('shorteningMm', 80, 0)],
    compute: ({ n }) => ({ value: overlapMm(n('lengthMm'), n('roundMm'), n('shorteningMm')) }),
  },
  'suture-strength': {
    title: 'Strength left in a suture',
    formula: 'Published curve',
    unit: '%',
    source: 'Polyglactin 910 25% at 4 weeks, none by week 5; polydioxanone 50% at 4 weeks, 25% at 6 (read)',
    inputs: [
      choice('material', ['polyglactin-910', 'polydioxanone', 'nylon', 'polyester', 'polypropylene']),
      number('day', 'days', 0, 2000),
    ],
    compute: ({ n, s }) => {
      const left = strengthLeft(s('material'), n('day'));
      if (left === undefined) return undefined;
      return left.low === left.high
        ? { value: left.low * 100 }
        : { low: left.low * 100, high: left.high * 100 };
    },
  },
  'axial-shift': {
    title: 'Change of refraction when the eye lengthens',
    formula: 'Thin lens, vergence, emmetropic pseudophake',
    unit: 'D',
    source: 'Computed',
    inputs: [
      number('lengtheningMm', 'mm', -3, 5),
      axial,
      number('keratometryDioptres', 'D', 30, 60, opticsDefaults.keratometryDioptres),
      mm('vertexMm', 20, opticsDefaults.vertexMm),
    ],
    compute: ({ n }) => ({
      value: shiftFromLengthening(n('lengtheningMm'), {
        ...opticsDefaults,
        axialLengthMm: n('axialLengthMm'),
        keratometryDioptres: n('keratometryDioptres'),
        vertexMm: n('vertexMm'),
      }),
    }),
  },
};
