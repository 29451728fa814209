import type { Eye, Posture, Quadrant } from '../../../src/domain/record/schema.ts';

/*
 * The geometry that the generated cases are built on. It is written out again from the published figures rather than
 * taken from the product, so that a mistake there cannot hide itself here.
 */

/** Clock hour brought into 1 up to 13. */
export const wrap = (clock: number): number => ((((clock - 1) % 12) + 12) % 12) + 1;

/** Hours from one position to another, clockwise. */
export const clockwise = (from: number, to: number): number => (((to - from) % 12) + 12) % 12;

/** Shortest way between two positions, hours. */
export const apart = (a: number, b: number): number => Math.min(clockwise(a, b), clockwise(b, a));

export const within = (clock: number, from: number, to: number): boolean =>
  clockwise(from, clock) <= clockwise(from, to);

export type Muscle = 'medial' | 'superior' | 'lateral' | 'inferior';

/** The surgeon sees temporal at 9 in a right eye and at 3 in a left. */
export const muscleClock = (eye: Eye): Record<Muscle, number> =>
  eye === 'right'
    ? { superior: 12, medial: 3, inferior: 6, lateral: 9 }
    : { superior: 12, medial: 9, inferior: 6, lateral: 3 };

const behindLimbus: Record<Muscle, number> = { medial: 5.5, inferior: 6.5, lateral: 6.9, superior: 7.7 };
const oraByMeridian: Record<Muscle, number> = { medial: 6.3, inferior: 7, lateral: 7.8, superior: 7.7 };

const roundTheClock = (values: Record<Muscle, number>, clock: number, eye: Eye): number => {
  const at = muscleClock(eye);
  const byHour = new Map((Object.keys(at) as Muscle[]).map((muscle) => [at[muscle], values[muscle]]));
  const before = Math.floor(wrap(clock) / 3) * 3;
  const lower = byHour.get(before === 0 ? 12 : before) ?? 0;
  const upper = byHour.get(before + 3 > 12 ? 3 : before + 3) ?? 0;
  return lower + (upper - lower) * ((wrap(clock) - before) / 3);
};

/** Insertions of the recti behind the limbus, interpolated round the clock, mm. */
export const insertionMm = (clock: number, eye: Eye): number => roundTheClock(behindLimbus, clock, eye);

export const oraMm = (clock: number, eye: Eye): number => roundTheClock(oraByMeridian, clock, eye);

const LIMBUS_RADIUS_MM = 5.9;
const polar = (axialLengthMm: number, mm: number) =>
  Math.asin(LIMBUS_RADIUS_MM / (axialLengthMm / 2)) + mm / (axialLengthMm / 2);

/** Arc from limbus to equator, mm. */
export const equatorMm = (axialLengthMm: number): number => {
  const radius = axialLengthMm / 2;
  return radius * (Math.PI / 2 - Math.asin(LIMBUS_RADIUS_MM / radius));
};

/** Circumference of the parallel at an arc behind the limbus, mm. */
export const circumferenceMm = (axialLengthMm: number, mm: number): number =>
  Math.PI * axialLengthMm * Math.sin(polar(axialLengthMm, mm));

export const quadrantsClockwise = (eye: Eye): readonly [Quadrant, Quadrant, Quadrant, Quadrant] =>
  eye === 'right'
    ? ['superonasal', 'inferonasal', 'inferotemporal', 'superotemporal']
    : ['superotemporal', 'inferotemporal', 'inferonasal', 'superonasal'];

/** Quadrant of a position; one on a border counts to the quadrant clockwise of it. */
export const quadrantOf = (clock: number, eye: Eye): Quadrant =>
  quadrantsClockwise(eye)[Math.floor((wrap(clock) % 12) / 3) as 0 | 1 | 2 | 3];

/** Hours that the arc from–to shares with each quadrant. */
export const sharedHours = (from: number, to: number, eye: Eye): Record<Quadrant, number> => {
  const shared = { superotemporal: 0, superonasal: 0, inferonasal: 0, inferotemporal: 0 };
  const step = 0.05;
  for (let gone = step / 2; gone < clockwise(from, to); gone += step) {
    shared[quadrantOf(from + gone, eye)] += step;
  }
  return shared;
};

type Direction = readonly [number, number, number];
type Position = NonNullable<Posture['position']>;

const unit = ([x, y, z]: Direction): Direction => {
  const length = Math.hypot(x, y, z);
  return [x / length, y / length, z / length];
};

/** Where up is, seen from the eye: x to 3 o'clock, y to 12 o'clock, z out through the cornea. */
const up: Record<Exclude<Position, 'free'>, Direction> = {
  upright: [0, 1, 0],
  'face-down': [0, 0, -1],
  'right-side': [1, 0, 0],
  'left-side': [-1, 0, 0],
  'right-cheek': [1, 0, -1],
  'left-cheek': [-1, 0, -1],
  'supine-head-up-30': [0, 0.5, 0.866],
  'supine-head-up-45': [0, 1, 1],
  supine: [0, 0, 1],
  'steep-head-down': [0, -1, -0.3],
};

/** Angle between the highest point of the eye wall in a position and a place on the retina, degrees. */
export const fromTop = (
  position: Exclude<Position, 'free'>,
  place: { clock: number; mm: number },
  axialLengthMm: number,
): number => {
  const theta = polar(axialLengthMm, place.mm);
  const turn = (place.clock / 12) * 2 * Math.PI;
  const at: Direction = [Math.sin(theta) * Math.sin(turn), Math.sin(theta) * Math.cos(turn), Math.cos(theta)];
  const [x, y, z] = unit(up[position]);
  return (Math.acos(x * at[0] + y * at[1] + z * at[2]) * 180) / Math.PI;
};

/** Volume behind the lens, mL: a rough figure for filling. */
export const cavityMl = (axialLengthMm: number): number =>
  (4 / 3) * Math.PI * (axialLengthMm / 2 - 1.3) ** 3 * 0.92 * 0.001;

/** Half the arc that a bubble wets, degrees, from the share of the cavity that it fills. */
export const bubbleHalfArc = (share: number): number => {
  let [low, high] = [0, Math.PI];
  for (let turn = 0; turn < 40; turn += 1) {
    const middle = (low + high) / 2;
    const height = 1 - Math.cos(middle);
    if ((height * height * (3 - height)) / 4 < share) low = middle;
    else high = middle;
  }
  return (low * 180) / Math.PI;
};
