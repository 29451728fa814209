import { describe, expect, it } from 'vitest';
import { kappa, pChart, sampleSize, wilson } from '../../src/domain/auditing/statistics.ts';

describe('Wilson intervals: Newcombe 1998, worked examples (from memory, recomputed)', () => {
  it.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
  ])('%i of %i: %f to %f', (hits, of, low, high) => {
    const interval = wilson(hits, of);
    expect(interval?.low).toBeCloseTo(low, 4);
    expect(interval?.high).toBeCloseTo(high, 4);
  });
});

describe('Sample size for p 0.5 to ± 0.05 (computed from the formula)', () => {
  it('is 385, and 278 of a population of 1000', () => {
    expect(sampleSize(0.5, 0.05)).toBe(385);
    expect(sampleSize(0.5, 0.05, 1000)).toBe(278);
  });
});

describe('Cohen’s kappa of 20, 5, 10, 15 (computed)', () => {
  it('is 0.40', () => {
    expect(kappa(20, 5, 10, 15)).toBeCloseTo(0.4, 10);
  });
});

describe('p-chart: NIST/SEMATECH handbook, samples of 50 with mean 0.2313 (read second-hand)', () => {
  it('has limits 0.0524 and 0.4102', () => {
    // 347 of 1500 is the mean proportion of thirty samples of fifty.
    const { centre, points } = pChart(Array.from({ length: 30 }, () => ({ hits: 347 / 30, of: 50 })));
    expect(centre).toBeCloseTo(0.2313, 4);
    expect(points[0]?.limits.low).toBeCloseTo(0.0524, 4);
    expect(points[0]?.limits.high).toBeCloseTo(0.4102, 4);
  });
});
