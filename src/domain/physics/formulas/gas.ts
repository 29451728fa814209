import {
  daysUntil,
  expansionOf,
  gasFacts,
  halfLifeDays,
  percentOf,
  pneumaticMl,
  pressureAtAltitude,
  pressures,
  pureMl,
  remaining,
  spanDays,
  volumeAtPressure,
} from '../gas.ts';
import {
  ALERT,
  asGas,
  asLens,
  type Formula,
  gas,
  lens,
  number,
  percent,
  THOMPSON,
  usualPercent,
} from './formula.ts';

/** Formulas of gas. */
export const gasFormulas: Readonly<Record<string, Formula>> = {
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
};
