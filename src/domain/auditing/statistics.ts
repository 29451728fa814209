/** Normal quantile of a two-sided 95% interval. */
const Z95 = 1.959963984540054;

export interface Interval {
  low: number;
  high: number;
}

/**
 * Wilson score interval of a proportion, 95%, without continuity correction.
 * `hits` of `of`, 0 ≤ hits ≤ of; `undefined` when nothing was looked at.
 * Source: Newcombe 1998, method 3.
 */
export const wilson = (hits: number, of: number): Interval | undefined => {
  if (of <= 0 || hits < 0 || hits > of) return undefined;
  const z2 = Z95 * Z95;
  const middle = 2 * hits + z2;
  const reach = Z95 * Math.sqrt(z2 + 4 * hits * (1 - hits / of));
  const whole = 2 * (of + z2);
  return { low: Math.max(0, (middle - reach) / whole), high: Math.min(1, (middle + reach) / whole) };
};

/**
 * Notes to draw so that a proportion near `expected` is known to ± `precision` with 95% confidence,
 * corrected for a finite population when its size is given. All proportions from 0 to 1.
 * Formula: n₀ = z²p(1−p)/d², z = 1.96; n = n₀/(1 + (n₀−1)/N).
 */
export const sampleSize = (expected: number, precision: number, population?: number): number => {
  const unbounded = (1.96 ** 2 * expected * (1 - expected)) / precision ** 2;
  if (population === undefined) return Math.ceil(unbounded);
  return Math.min(population, Math.ceil(unbounded / (1 + (unbounded - 1) / population)));
};

/**
 * Cohen's kappa of two readers on yes/no items: both yes, only the first, only the second, both no.
 * `undefined` when nothing was read or agreement by chance is complete.
 */
export const kappa = (
  bothYes: number,
  firstOnly: number,
  secondOnly: number,
  bothNo: number,
): number | undefined => {
  const of = bothYes + firstOnly + secondOnly + bothNo;
  if (of === 0) return undefined;
  const observed = (bothYes + bothNo) / of;
  const firstYes = (bothYes + firstOnly) / of;
  const secondYes = (bothYes + secondOnly) / of;
  const chance = firstYes * secondYes + (1 - firstYes) * (1 - secondYes);
  return chance === 1 ? undefined : (observed - chance) / (1 - chance);
};

export interface PChartPoint {
  proportion: number;
  limits: Interval;
  outside: boolean;
}

/**
 * Shewhart p-chart: centre p̄, limits p̄ ± 3√(p̄(1−p̄)/n), cut at 0 and 1.
 * Source: NIST/SEMATECH handbook, section 6.3.3.2. Empty samples are left out.
 */
export const pChart = (
  samples: readonly { hits: number; of: number }[],
): { centre: number; points: PChartPoint[] } => {
  const read = samples.filter(({ of }) => of > 0);
  const total = read.reduce((sum, { of }) => sum + of, 0);
  const centre = total === 0 ? 0 : read.reduce((sum, { hits }) => sum + hits, 0) / total;
  const points = read.map(({ hits, of }) => {
    const reach = 3 * Math.sqrt((centre * (1 - centre)) / of);
    const limits = { low: Math.max(0, centre - reach), high: Math.min(1, centre + reach) };
    const proportion = hits / of;
    return { proportion, limits, outside: proportion < limits.low || proportion > limits.high };
  });
  return { centre, points };
};
