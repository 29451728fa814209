import type { Globe } from '../anatomy/globe.ts';
import type { Vector } from '../anatomy/surface.ts';
import { angleBetween, directionOf, type Place } from '../anatomy/surface.ts';
import type { Posture } from '../record/schema.ts';

/*
 * A bubble in a sphere: a cap of half angle α around the highest point (common formula, computed):
 * h = R(1 − cos α), V = πh²(3R − h)/3. The surface of the fluid is taken as flat.
 */

/** Volume, mL, of a cap that touches an arc of wall, degrees (twice the half angle), in a cavity of a radius, mm. */
export const capVolumeMl = (arcDegrees: number, radiusMm: number): number => {
  const h = radiusMm * (1 - Math.cos((arcDegrees * Math.PI) / 360));
  return (Math.PI * h ** 2 * (3 * radiusMm - h)) / 3 / 1000;
};

/** Volume of the whole cavity, mL. */
export const cavityMl = (radiusMm: number): number => ((4 / 3) * Math.PI * radiusMm ** 3) / 1000;

/** Arc of wall in contact, degrees, for a fill from 0 to 1; the inverse of `capVolumeMl`, found by halving. */
export const arcOfFill = (fill: number): number => {
  if (fill <= 0) return 0;
  if (fill >= 1) return 360;
  let low = 0;
  let high = 360;
  for (let step = 0; step < 40; step += 1) {
    const middle = (low + high) / 2;
    if (capVolumeMl(middle, 10) / cavityMl(10) < fill) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
};

export type Position = NonNullable<Posture['position']>;

const turned = (degrees: number): [sin: number, cos: number] => [
  Math.sin((degrees * Math.PI) / 180),
  Math.cos((degrees * Math.PI) / 180),
];

const [sin30, cos30] = turned(30);
const [sin45, cos45] = turned(45);
const [sin60, cos60] = turned(60);

/**
 * Which way is up, in eye coordinates (right as the surgeon sees it, 12 o'clock, cornea), for each position of the head. The patient's
 * right is the surgeon's left, so lying on the right side brings 3 o'clock uppermost.
 */
const upIn: Readonly<Record<Exclude<Position, 'free'>, Vector>> = {
  upright: [0, 1, 0],
  'face-down': [0, 0, -1],
  supine: [0, 0, 1],
  'right-side': [1, 0, 0],
  'left-side': [-1, 0, 0],
  'right-cheek': [sin45, 0, -cos45],
  'left-cheek': [-sin45, 0, -cos45],
  'supine-head-up-30': [0, sin30, cos30],
  'supine-head-up-45': [0, sin45, cos45],
  'steep-head-down': [0, -sin60, -cos60],
};

export const upOf = (position: Position): Vector | undefined =>
  position === 'free' ? undefined : upIn[position];

export const knownPositions = Object.keys(upIn) as Exclude<Position, 'free'>[];

/** What lies heavier than water rests at the lowest point instead of the highest. */
export type Buoyancy = 'floats' | 'sinks';

/**
 * By how many degrees the edge of the bubble lies beyond a place, with a fill from 0 to 1 and the head in a position; negative: the place
 * is not touched. Independent of the size of the globe. `undefined` when no position is kept.
 */
export const coverDegrees = (
  globe: Globe,
  place: Place,
  fill: number,
  position: Position,
  buoyancy: Buoyancy = 'floats',
): number | undefined => {
  const up = upOf(position);
  if (up === undefined) return undefined;
  const pole: Vector = buoyancy === 'floats' ? up : [-up[0], -up[1], -up[2]];
  const away = (angleBetween(directionOf(globe, place), pole) * 180) / Math.PI;
  return arcOfFill(fill) / 2 - away;
};

/** Positions in which the bubble touches a place, the surest first. */
export const positionsThatCover = (
  globe: Globe,
  place: Place,
  fill: number,
  buoyancy: Buoyancy = 'floats',
): Position[] =>
  knownPositions
    .map((position) => ({ position, cover: coverDegrees(globe, place, fill, position, buoyancy) ?? -1 }))
    .filter(({ cover }) => cover >= 0)
    .sort((a, b) => b.cover - a.cover)
    .map(({ position }) => position);
