import type { Eye, RetinalBreak } from '../record/schema.ts';
import { clockAngle } from './clock.ts';
import { equatorMm, type Globe, parallelMm, polarAngle, poleMm } from './globe.ts';
import { oraRangeMm } from './insertions.ts';

/** A place on the wall. */
export interface Place {
  clock: number;
  /** Millimetres along the wall behind the limbus. */
  mm: number;
}

/** Eye coordinates of a direction from the centre: right as the surgeon sees it, up (12 o'clock), forward to the cornea. */
export type Vector = readonly [right: number, up: number, forward: number];

export const dot = (a: Vector, b: Vector): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

/** Direction from the centre of the globe to a place on its wall, of length 1. */
export const directionOf = (globe: Globe, { clock, mm }: Place): Vector => {
  const polar = polarAngle(globe, mm);
  const round = clockAngle(clock);
  return [Math.sin(polar) * Math.sin(round), Math.sin(polar) * Math.cos(round), Math.cos(polar)];
};

/** Angle between two directions, radians. */
export const angleBetween = (a: Vector, b: Vector): number => Math.acos(Math.max(-1, Math.min(1, dot(a, b))));

/** Shortest way along the outer wall between two places, mm (great circle). */
export const distanceMm = (globe: Globe, a: Place, b: Place): number =>
  globe.radiusMm * angleBetween(directionOf(globe, a), directionOf(globe, b));

/** Breadth of one clock hour at a parallel, mm. */
export const hourMm = (globe: Globe, mm: number): number => parallelMm(globe, mm) / 12;

export type Zone = NonNullable<RetinalBreak['zone']>;

/** A zone as a range, mm behind the limbus. */
export const zoneRangeMm = (zone: Zone, globe: Globe, clock: number, eye: Eye): readonly [number, number] => {
  const [oraFrom, oraTo] = oraRangeMm(clock, eye);
  const equator = equatorMm(globe);
  const ranges: Readonly<Record<Zone, readonly [number, number]>> = {
    ora: [oraFrom, oraTo + 1],
    'pre-equatorial': [oraTo, equator - 1],
    equator: [equator - 1.5, equator + 1.5],
    'post-equatorial': [equator + 1, poleMm(globe) - 9],
    'posterior-pole': [poleMm(globe) - 9, poleMm(globe)],
  };
  return ranges[zone];
};
