import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  arcHours,
  clockwise,
  hoursApart,
  mayLieIn,
  onArc,
  quadrantAt,
  quadrantMiddle,
  showClock,
  wrapClock,
} from '../../../src/domain/anatomy/clock.ts';
import {
  equatorMm,
  globeOf,
  mmBehindLimbus,
  parallelMm,
  polarAngle,
} from '../../../src/domain/anatomy/globe.ts';
import { insertionMm, oraRangeMm } from '../../../src/domain/anatomy/insertions.ts';
import { distanceMm, zoneRangeMm } from '../../../src/domain/anatomy/surface.ts';

const clock = fc.integer({ min: 4, max: 51 }).map((quarters) => quarters / 4);
const axial = fc.double({ min: 18, max: 36, noNaN: true });
const arc = fc.double({ min: 0, max: 30, noNaN: true });
/** The same meridian of the other eye, seen by the surgeon. */
const mirrored = (hour: number) => wrapClock(12 - hour);

describe('clock', () => {
  it('goes round once and comes back', () => {
    fc.assert(
      fc.property(clock, clock, (a, b) => {
        expect(wrapClock(a + 12)).toBe(a);
        expect(wrapClock(a + clockwise(a, b))).toBeCloseTo(b, 10);
        expect(hoursApart(a, b)).toBe(hoursApart(b, a));
        expect(hoursApart(a, b)).toBeLessThanOrEqual(6);
      }),
    );
  });

  it('has arcs that cross 12, and both ends on them', () => {
    expect(onArc(12, { from: 11, to: 2 })).toBe(true);
    expect(onArc(6, { from: 11, to: 2 })).toBe(false);
    expect(arcHours({ from: 6, to: 6 })).toBe(12);
    fc.assert(
      fc.property(clock, clock, (from, to) => {
        expect(onArc(from, { from, to })).toBe(true);
        expect(onArc(to, { from, to })).toBe(true);
      }),
    );
  });

  it('mirrors quadrants between the eyes', () => {
    fc.assert(
      fc.property(
        clock.filter((hour) => (hour % 12) % 3 !== 0),
        (hour) => {
          expect(quadrantAt(hour, 'left')).toBe(quadrantAt(mirrored(hour), 'right'));
          expect(mayLieIn(quadrantAt(hour, 'left'), hour, 0, 'left')).toBe(true);
        },
      ),
    );
    expect(quadrantMiddle('superotemporal', 'left')).toBe(1.5);
    expect(quadrantMiddle('superotemporal', 'right')).toBe(10.5);
  });

  it('is written as it is read', () => {
    expect([4.5, 12, 12.25].map(showClock)).toEqual(['4:30', '12 o’clock', '12:15']);
  });
});

describe('globe', () => {
  it('turns arcs into angles and back', () => {
    fc.assert(
      fc.property(axial, arc, (length, mm) => {
        const globe = globeOf(length);
        expect(mmBehindLimbus(globe, polarAngle(globe, mm))).toBeCloseTo(mm, 9);
      }),
    );
  });

  it('is widest at the equator, and the same as far before as behind it', () => {
    fc.assert(
      fc.property(axial, fc.double({ min: 0, max: 8, noNaN: true }), (length, away) => {
        const globe = globeOf(length);
        const equator = equatorMm(globe);
        expect(parallelMm(globe, equator - away)).toBeCloseTo(parallelMm(globe, equator + away), 8);
        expect(parallelMm(globe, equator - away)).toBeLessThanOrEqual(parallelMm(globe, equator) + 1e-9);
      }),
    );
  });
});

describe('insertions and ora', () => {
  it('are the same in both eyes, mirrored, and stay between the published ends', () => {
    fc.assert(
      fc.property(clock, (hour) => {
        expect(insertionMm(hour, 'left')).toBeCloseTo(insertionMm(mirrored(hour), 'right'), 10);
        expect(insertionMm(hour, 'left')).toBeGreaterThanOrEqual(5.5);
        expect(insertionMm(hour, 'left')).toBeLessThanOrEqual(7.7);
        const [low, high] = oraRangeMm(hour, 'right');
        expect(low).toBeLessThan(high);
      }),
    );
  });
});

describe('surface', () => {
  it('has distances that are the same both ways and never longer than a detour', () => {
    const place = fc.record({ clock, mm: arc });
    fc.assert(
      fc.property(axial, place, place, place, (length, a, b, c) => {
        const globe = globeOf(length);
        expect(distanceMm(globe, a, b)).toBeCloseTo(distanceMm(globe, b, a), 9);
        expect(distanceMm(globe, a, c)).toBeLessThanOrEqual(
          distanceMm(globe, a, b) + distanceMm(globe, b, c) + 1e-6,
        );
      }),
    );
  });

  it('measures along a meridian what the arcs differ by', () => {
    fc.assert(
      fc.property(clock, arc, arc, (hour, a, b) => {
        expect(distanceMm(globeOf(24), { clock: hour, mm: a }, { clock: hour, mm: b })).toBeCloseTo(
          Math.abs(a - b),
          5,
        );
      }),
    );
  });

  it('has zones in order from the ora to the pole', () => {
    const globe = globeOf(24);
    const fronts = (['ora', 'equator', 'post-equatorial', 'posterior-pole'] as const).map(
      (zone) => zoneRangeMm(zone, globe, 3, 'right')[0],
    );
    expect(fronts).toEqual([...fronts].sort((a, b) => a - b));
  });
});
