import { clockAngle } from '../../domain/anatomy/clock.ts';
import type { GlobePoint } from './globe-model.ts';

/** Radius of the drawing: the posterior pole in the middle, 5 mm behind the limbus at the rim, in front of the ora. */
export const rim = 84;
const RIM_MM = 5;

/** Distance from the middle of the drawing for a place so many mm behind the limbus. */
export const radiusAt = (mm: number, poleMm: number): number =>
  Math.max(0, (rim * (poleMm - mm)) / (poleMm - RIM_MM));

/** Where a place lies on the drawing, as the surgeon sees it: 12 o'clock up, hours clockwise. */
export const fundusPoint = ({ clock, mm }: GlobePoint, poleMm: number): readonly [x: number, y: number] => {
  const radius = radiusAt(mm, poleMm);
  const angle = clockAngle(clock);
  return [radius * Math.sin(angle), -radius * Math.cos(angle)];
};

const shown = ([x, y]: readonly [number, number]) => `${x.toFixed(1)} ${y.toFixed(1)}`;

/** A line through points. */
export const fundusLine = (points: readonly GlobePoint[], poleMm: number): string =>
  points.map((point, at) => `${at === 0 ? 'M' : 'L'}${shown(fundusPoint(point, poleMm))}`).join('');

/** The area between two lines that run the same way. */
export const fundusArea = (
  front: readonly GlobePoint[],
  back: readonly GlobePoint[],
  poleMm: number,
): string => `${fundusLine([...front, ...back.toReversed()], poleMm)}Z`;
