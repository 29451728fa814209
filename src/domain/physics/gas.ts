export const gases = ['air', 'SF6', 'C2F6', 'C3F8'] as const;
export type Gas = (typeof gases)[number];
export type LensState = 'phakic' | 'aphakic';

interface GasFacts {
  /** Volume of the pure gas at its largest, times the injected. */
  expansion: number;
  /** Days until it is largest. */
  largestDays: readonly [number, number];
  /** How long it lasts in the eye, days. */
  lastsDays: readonly [number, number];
  /** Concentration at which it neither grows nor shrinks, %. */
  isoexpansile: { usual: number; low: number; high: number };
}

/** Royal College of Ophthalmologists safety alert, 18 December 2018; ranges Sci Rep 2020 s41598-020-75493-9 (read). */
export const gasFacts: Readonly<Record<Gas, GasFacts>> = {
  air: {
    expansion: 1,
    largestDays: [0, 0],
    lastsDays: [5, 7],
    isoexpansile: { usual: 100, low: 100, high: 100 },
  },
  SF6: {
    expansion: 2,
    largestDays: [1, 2],
    lastsDays: [12, 16],
    isoexpansile: { usual: 20, low: 18, high: 20 },
  },
  C2F6: {
    expansion: 3,
    largestDays: [1, 3],
    lastsDays: [28, 35],
    isoexpansile: { usual: 16, low: 16, high: 16 },
  },
  C3F8: {
    expansion: 4,
    largestDays: [3, 4],
    lastsDays: [50, 60],
    isoexpansile: { usual: 14, low: 12, high: 16 },
  },
};

export const isGas = (agent: string | undefined): agent is Gas => gases.some((gas) => gas === agent);

/** Pure gas, mL, to draw up for a concentration, %, in a syringe, mL; dead space of filter and tubing, mL, is filled with pure gas. */
export const pureMl = (syringeMl: number, percent: number, deadSpaceMl = 0): number =>
  (syringeMl * percent) / 100 - deadSpaceMl;

/** Concentration, %, of so much pure gas, mL, made up to the syringe, mL. */
export const percentOf = (pure: number, syringeMl: number, deadSpaceMl = 0): number =>
  ((pure + deadSpaceMl) / syringeMl) * 100;

/**
 * Times by which a mixture grows: a pure gas by its factor, the isoexpansile concentration by 1, and in a straight line between.
 * An estimate; below isoexpansile it shrinks from the start.
 */
export const expansionOf = (gas: Gas, percent: number): number => {
  const { expansion, isoexpansile } = gasFacts[gas];
  if (gas === 'air') return 1;
  const grown = 1 + ((expansion - 1) * (percent - isoexpansile.usual)) / (100 - isoexpansile.usual);
  return Math.max(1, grown);
};

type HalfLives = readonly (readonly [percent: number, phakic: number, aphakic: number | null])[];

/**
 * Half-lives, days, by concentration. Thompson, Arch Ophthalmol 1989;107:687 (air, 20% SF6, 10% C3F8, phakic and aphakic) and
 * Thompson 1992;110:1594 (C3F8 5, 10, 15, 20%) (read). Of C3F8 10% there are two figures, 5.7 and 6.5: both are kept as a range.
 */
const halfLives: Readonly<Partial<Record<Gas, HalfLives>>> = {
  air: [[100, 1.6, 0.9]],
  SF6: [[20, 2.8, 2.4]],
  C3F8: [
    [5, 4.2, null],
    [10, 5.7, 4.5],
    [10, 6.5, null],
    [15, 8.0, null],
    [20, 12.5, null],
  ],
};

/**
 * Half-life in days as a range: the published figures around this concentration. A lens that was removed makes it shorter; where no figure is
 * published for that state, the low end is scaled as for 10% C3F8 (4.5/5.7). C2F6: from how long it lasts, to a hundredth.
 */
export const halfLifeDays = (gas: Gas, percent: number, lens: LensState): { low: number; high: number } => {
  const published = halfLives[gas];
  if (published === undefined) {
    const [low, high] = gasFacts[gas].lastsDays;
    return { low: low / Math.log2(100), high: high / Math.log2(100) };
  }
  const at = (row: HalfLives[number]) => (lens === 'aphakic' ? (row[2] ?? row[1] * (4.5 / 5.7)) : row[1]);
  const distance = (row: HalfLives[number]) => Math.abs(row[0] - percent);
  const exact = published.filter((row) => row[0] === percent);
  if (exact.length > 0) return { low: Math.min(...exact.map(at)), high: Math.max(...exact.map(at)) };
  const below = published.filter((row) => row[0] < percent);
  const above = published.filter((row) => row[0] > percent);
  const near = [
    ...below.filter((row) => distance(row) === Math.min(...below.map(distance))),
    ...above.filter((row) => distance(row) === Math.min(...above.map(distance))),
  ];
  return { low: Math.min(...near.map(at)), high: Math.max(...near.map(at)) };
};

/** Share that is left after so many days of first-order loss, 0 to 1. */
export const remaining = (days: number, halfLife: number): number => 2 ** (-days / halfLife);

/** Days until a share is left: t½·log2(1/share). */
export const daysUntil = (share: number, halfLife: number): number => halfLife * Math.log2(1 / share);

/**
 * When the gas may have gone, days, as a range that is no promise: from a tenth at the short half-life or the published span, whichever is
 * earlier, to a hundredth at the long one or the published span, whichever is later. Only the surgeon who has seen it gone knows.
 */
export const spanDays = (gas: Gas, percent: number, lens: LensState): { low: number; high: number } => {
  const half = halfLifeDays(gas, percent, lens);
  const [low, high] = gasFacts[gas].lastsDays;
  return { low: Math.min(low, daysUntil(0.1, half.low)), high: Math.max(high, daysUntil(0.01, half.high)) };
};

/** Pressure at sea level and in a cabin at about 8,000 ft, mmHg. */
export const pressures = { seaLevelMmHg: 760, cabinMmHg: 564 } as const;

/** Volume, mL, of so much gas taken from one pressure to another when the eye's pressure is not held (Boyle). */
export const volumeAtPressure = (
  volumeMl: number,
  toMmHg: number,
  fromMmHg: number = pressures.seaLevelMmHg,
): number => (volumeMl * fromMmHg) / toMmHg;

/** Pressure of the standard atmosphere at an altitude, m, in mmHg (barometric formula, computed). */
export const pressureAtAltitude = (metres: number): number => 760 * (1 - 2.25577e-5 * metres) ** 5.25588;

/** Pure gas, mL, for a pneumatic retinopexy (read). */
export const pneumaticMl: Readonly<Record<Gas, readonly [number, number] | undefined>> = {
  air: [0.5, 1],
  SF6: [0.5, 0.5],
  C2F6: undefined,
  C3F8: [0.3, 0.3],
};
