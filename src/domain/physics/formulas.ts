import { arcHours, quadrantAt } from '../anatomy/clock.ts';
import { circumferenceMm, defaults, equatorMm, globeOf, parallelMm, poleMm } from '../anatomy/globe.ts';
import { insertionMm, oraRangeMm } from '../anatomy/insertions.ts';
import { distanceMm, hourMm } from '../anatomy/surface.ts';
import { fail, ok, type Result } from '../result.ts';
import { curveLengthMm, heightFromShortening, overlapMm, shorteningForHeight } from './band.ts';
import { arcOfFill, capVolumeMl, cavityMl, coverDegrees, knownPositions } from './bubble.ts';
import {
  daysUntil,
  expansionOf,
  type Gas,
  gases,
  gasFacts,
  halfLifeDays,
  type LensState,
  percentOf,
  pneumaticMl,
  pressureAtAltitude,
  pressures,
  pureMl,
  remaining,
  spanDays,
  volumeAtPressure,
} from './gas.ts';
import { opticsDefaults, shiftFromLengthening } from './refraction.ts';
import { strengthLeft } from './sutures.ts';

interface NumberInput {
  name: string;
  unit: string;
  min: number;
  max: number;
  /** Taken when it is not given; without one the input is needed. */
  usual?: number;
}

interface ChoiceInput {
  name: string;
  choices: readonly string[];
  usual?: string;
}

export type Answered = { value: number | string } | { low: number; high: number };

type Given = Readonly<Record<string, number | string>>;

interface Formula {
  title: string;
  formula: string;
  unit: string;
  source: string;
  inputs: readonly (NumberInput | ChoiceInput)[];
  compute: (given: { n: (name: string) => number; s: (name: string) => string }) => Answered | undefined;
}

const mm = (name: string, max = 60, usual?: number): NumberInput => ({
  name,
  unit: 'mm',
  min: 0,
  max,
  ...(usual === undefined ? {} : { usual }),
});
const number = (name: string, unit: string, min: number, max: number, usual?: number): NumberInput => ({
  name,
  unit,
  min,
  max,
  ...(usual === undefined ? {} : { usual }),
});
const choice = (name: string, choices: readonly string[], usual?: string): ChoiceInput => ({
  name,
  choices,
  ...(usual === undefined ? {} : { usual }),
});

const axial = number('axialLengthMm', 'mm', 14, 40, defaults.axialLengthMm);
const clock = (name: string, usual?: number) => number(name, 'o’clock', 1, 12.999, usual);
const eye = choice('eye', ['right', 'left'], 'right');
const gas = choice('gas', gases);
const lens = choice('lens', ['phakic', 'aphakic'], 'phakic');
const percent = number('percent', '%', 0, 100);
const usualPercent = (of: Gas) => gasFacts[of].isoexpansile.usual;

const TILLAUX = 'Spiral of Tillaux, IOVS 2022;63:1877 (read)';
const SPHERE = 'Sphere (computed)';
const CAP = 'Cap of a sphere (computed)';
const THOMPSON = 'Thompson, Arch Ophthalmol 1989;107:687 and 1992;110:1594 (read)';
const ALERT = 'Royal College of Ophthalmologists safety alert, 18 December 2018 (read)';

const asGas = (name: string): Gas => gases.find((one) => one === name) ?? 'air';
const asLens = (name: string): LensState => (name === 'aphakic' ? 'aphakic' : 'phakic');
const asEye = (name: string) => (name === 'left' ? 'left' : 'right');

/** Every formula by name: what it is, what it needs, where it comes from. */
export const formulas: Readonly<Record<string, Formula>> = {
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
  'gas-dilution-pure-ml': {
    title: 'Pure gas for a concentration',
    formula: 'syringe mL × % − dead space mL',
    unit: 'mL',
    source: 'Computed',
    inputs: [number('syringeMl', 'mL', 0.1, 200), percent, number('deadSpaceMl', 'mL', 0, 10, 0)],
    compute: ({ n }) => ({ value: pureMl(n('syringeMl'), n('percent'), n('deadSpaceMl')) }),
  },
  'gas-dilution-percent': {
    title: 'Concentration of pure gas made up to a syringe',
    formula: '(pure mL + dead space mL) / syringe mL',
    unit: '%',
    source: 'Computed',
    inputs: [
      number('pureMl', 'mL', 0, 200),
      number('syringeMl', 'mL', 0.1, 200),
      number('deadSpaceMl', 'mL', 0, 10, 0),
    ],
    compute: ({ n }) => ({ value: percentOf(n('pureMl'), n('syringeMl'), n('deadSpaceMl')) }),
  },
  'gas-isoexpansile': {
    title: 'Isoexpansile concentration',
    formula: 'Published',
    unit: '%',
    source: `${ALERT}; ranges Sci Rep 2020 s41598-020-75493-9 (read)`,
    inputs: [gas],
    compute: ({ s }) => {
      const { low, high } = gasFacts[asGas(s('gas'))].isoexpansile;
      return low === high ? { value: low } : { low, high };
    },
  },
  'gas-expansion': {
    title: 'Growth of a gas in the eye',
    formula: '1 + (pure expansion − 1)·(% − isoexpansile)/(100 − isoexpansile), not below 1',
    unit: 'times',
    source: `${ALERT}; in between a straight line (computed)`,
    inputs: [gas, number('percent', '%', 0, 100, 100)],
    compute: ({ n, s }) => ({ value: expansionOf(asGas(s('gas')), n('percent')) }),
  },
  'gas-largest-day': {
    title: 'When the gas is largest',
    formula: 'Published',
    unit: 'days',
    source: ALERT,
    inputs: [gas],
    compute: ({ s }) => {
      const [low, high] = gasFacts[asGas(s('gas'))].largestDays;
      return { low, high };
    },
  },
  'gas-half-life': {
    title: 'Half-life of a gas in the eye',
    formula: 'Published figures around the concentration',
    unit: 'days',
    source: THOMPSON,
    inputs: [gas, percent, lens],
    compute: ({ n, s }) => {
      const { low, high } = halfLifeDays(asGas(s('gas')), n('percent'), asLens(s('lens')));
      return low === high ? { value: low } : { low, high };
    },
  },
  'gas-remaining': {
    title: 'Share of the gas left',
    formula: '2^(−days/t½)',
    unit: '%',
    source: THOMPSON,
    inputs: [gas, percent, number('day', 'days', 0, 365), lens],
    compute: ({ n, s }) => {
      const { low, high } = halfLifeDays(asGas(s('gas')), n('percent'), asLens(s('lens')));
      const [least, most] = [remaining(n('day'), low) * 100, remaining(n('day'), high) * 100];
      return low === high ? { value: least } : { low: least, high: most };
    },
  },
  'gas-days-to-fraction': {
    title: 'Days until a share of the gas is left',
    formula: 't½·log2(1/share)',
    unit: 'days',
    source: THOMPSON,
    inputs: [gas, percent, number('fraction', 'of 1', 0.0001, 1, 0.1), lens],
    compute: ({ n, s }) => {
      const { low, high } = halfLifeDays(asGas(s('gas')), n('percent'), asLens(s('lens')));
      const [least, most] = [daysUntil(n('fraction'), low), daysUntil(n('fraction'), high)];
      return low === high ? { value: least } : { low: least, high: most };
    },
  },
  'gas-span': {
    title: 'How long the gas may last',
    formula: 't½·log2(10) to t½·log2(100), and the published span',
    unit: 'days',
    source: `${ALERT}; ${THOMPSON}`,
    inputs: [gas, lens],
    compute: ({ s }) => {
      const named = asGas(s('gas'));
      return spanDays(named, usualPercent(named), asLens(s('lens')));
    },
  },
  'altitude-volume': {
    title: 'Volume of gas at another pressure, not held',
    formula: 'V·P1/P2 (Boyle)',
    unit: 'mL',
    source: 'Computed',
    inputs: [
      number('volumeMl', 'mL', 0, 20),
      number('pressureMmHg', 'mmHg', 100, 800, pressures.cabinMmHg),
      number('fromMmHg', 'mmHg', 100, 800, pressures.seaLevelMmHg),
    ],
    compute: ({ n }) => ({ value: volumeAtPressure(n('volumeMl'), n('pressureMmHg'), n('fromMmHg')) }),
  },
  'altitude-pressure': {
    title: 'Pressure of the standard atmosphere',
    formula: '760·(1 − 2.25577·10⁻⁵·h)^5.25588',
    unit: 'mmHg',
    source: 'Barometric formula (computed)',
    inputs: [number('metres', 'm', 0, 11000)],
    compute: ({ n }) => ({ value: pressureAtAltitude(n('metres')) }),
  },
  'pneumatic-volume': {
    title: 'Pure gas for a pneumatic retinopexy',
    formula: 'Published',
    unit: 'mL',
    source: 'SF6 0.5 mL, C3F8 0.3 mL, air 0.5–1.0 mL (read)',
    inputs: [gas],
    compute: ({ s }) => {
      const range = pneumaticMl[asGas(s('gas'))];
      if (range === undefined) return undefined;
      return range[0] === range[1] ? { value: range[0] } : { low: range[0], high: range[1] };
    },
  },
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

const readInput = (
  input: NumberInput | ChoiceInput,
  given: string | number | undefined,
): Result<number | string> => {
  const value = given ?? input.usual;
  if (value === undefined) return fail('missing', `${input.name} is missing`);
  if ('choices' in input) {
    const chosen = input.choices.find((one) => one === String(value));
    return chosen === undefined
      ? fail('unknown', `${input.name} must be one of ${input.choices.join(', ')}`)
      : ok(chosen);
  }
  const written = typeof value === 'number' ? value : Number(value.replace(',', '.'));
  const fits = Number.isFinite(written) && value !== '' && written >= input.min && written <= input.max;
  return fits
    ? ok(written)
    : fail('out-of-range', `${input.name} must be a number from ${input.min} to ${input.max} ${input.unit}`);
};

export interface Computed {
  name: string;
  title: string;
  result: Answered;
  unit: string;
  formula: string;
  inputs: Given;
  source: string;
}

/** Answers one formula. Errors name the formulas, or the inputs with their units and bounds. */
export const compute = (name: string, given: Readonly<Record<string, string | number>>): Result<Computed> => {
  const formula = Object.hasOwn(formulas, name) ? formulas[name] : undefined;
  if (formula === undefined)
    return fail(
      'unknown-formula',
      `There is no formula ${name}; there are ${Object.keys(formulas).join(', ')}`,
    );
  const names = formula.inputs.map((input) => input.name);
  const stranger = Object.keys(given).find((key) => !names.includes(key));
  if (stranger !== undefined)
    return fail('unknown-input', `${name} has no ${stranger}; it takes ${names.join(', ')}`);
  const inputs: Record<string, number | string> = {};
  for (const input of formula.inputs) {
    const read = readInput(input, given[input.name]);
    if (!read.ok) return read;
    inputs[input.name] = read.value;
  }
  const result = formula.compute({ n: (key) => Number(inputs[key]), s: (key) => String(inputs[key]) });
  if (result === undefined) return fail('not-published', `${name} has no published value for these inputs`);
  return ok({
    name,
    title: formula.title,
    result,
    unit: formula.unit,
    formula: formula.formula,
    inputs,
    source: formula.source,
  });
};
