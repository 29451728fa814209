import { arcHours, type ClockArc, wrapClock } from '../anatomy/clock.ts';
import { type Globe, parallelMm, polarAngle } from '../anatomy/globe.ts';

/**
 * Greatest height of an encircling band, mm, that a shortening, mm, can give: h = ΔL/2π at any radius.
 * Flush, inelastic band: an upper bound. IOVS abstract 2357577 (read).
 */
export const heightFromShortening = (shorteningMm: number): number => shorteningMm / (2 * Math.PI);

/** Shortening, mm, that a height, mm, needs at least. */
export const shorteningForHeight = (heightMm: number): number => heightMm * 2 * Math.PI;

const STEPS = 48;

/**
 * Length along the wall, mm, of a curve given as millimetres behind the limbus by clock hour, over an arc; by numeric integration of
 * √((R·dθ)² + (R·sin θ·dφ)²).
 */
export const curveLengthMm = (globe: Globe, mmAt: (clock: number) => number, arc: ClockArc): number => {
  const hours = arcHours(arc);
  const step = hours / STEPS;
  let length = 0;
  let before = mmAt(wrapClock(arc.from));
  for (let at = 1; at <= STEPS; at += 1) {
    const after = mmAt(wrapClock(arc.from + at * step));
    const across = (globe.radiusMm * Math.sin(polarAngle(globe, (before + after) / 2)) * step * Math.PI) / 6;
    length += Math.hypot(across, after - before);
    before = after;
  }
  return length;
};

/** Overlap, mm, left of a band of a length once it lies round the globe and was shortened; negative: the ends do not meet. */
export const overlapMm = (lengthMm: number, roundMm: number, shortenedMm: number): number =>
  lengthMm - (roundMm - shortenedMm);

/** Length round the globe, mm, at a parallel. */
export const parallelLengthMm = (globe: Globe, mm: number): number => parallelMm(globe, mm);
