import type { Eye, Quadrant } from '../record/schema.ts';

/*
 * The clock face of the eye as the surgeon sees it: 12 up, hours clockwise, from 1 up to 13, so that half past twelve is 12.5.
 * Temporal is 9 o'clock in a right eye and 3 o'clock in a left (common practice).
 */

/** Clock hour brought into 1 up to 13. */
export const wrapClock = (clock: number): number => ((((clock - 1) % 12) + 12) % 12) + 1;

/** Hours from one position to another going clockwise, 0 up to 12. */
export const clockwise = (from: number, to: number): number => (((to - from) % 12) + 12) % 12;

/** Shortest way between two positions, 0 to 6 hours. */
export const hoursApart = (a: number, b: number): number => Math.min(clockwise(a, b), clockwise(b, a));

export interface ClockArc {
  from: number;
  /** Reached clockwise from `from`; the same hour is the whole round. */
  to: number;
}

/** Length of an arc, more than 0 up to 12 hours. */
export const arcHours = ({ from, to }: ClockArc): number => clockwise(from, to) || 12;

/** Whether a position lies on an arc, its ends included; arcs may cross 12. */
export const onArc = (clock: number, arc: ClockArc): boolean =>
  clockwise(arc.from, clock) <= arcHours(arc) + 1e-9;

/** Position as an angle from 12 o'clock, clockwise, radians. */
export const clockAngle = (clock: number): number => ((clock % 12) / 12) * 2 * Math.PI;

/** Quadrants clockwise from 12. */
export const quadrantsClockwise = (eye: Eye): readonly [Quadrant, Quadrant, Quadrant, Quadrant] =>
  eye === 'left'
    ? ['superotemporal', 'inferotemporal', 'inferonasal', 'superonasal']
    : ['superonasal', 'inferonasal', 'inferotemporal', 'superotemporal'];

/** Quadrant of a position; one on a border counts to the quadrant clockwise of it. */
export const quadrantAt = (clock: number, eye: Eye): Quadrant => {
  const [first, second, third, fourth] = quadrantsClockwise(eye);
  return [first, second, third, fourth][Math.floor((clock % 12) / 3)] ?? first;
};

/** The middle of a quadrant. */
export const quadrantMiddle = (quadrant: Quadrant, eye: Eye): number =>
  wrapClock(quadrantsClockwise(eye).indexOf(quadrant) * 3 + 1.5);

/** Whether a place that reaches `halfHours` to both sides may be said to lie in a quadrant. */
export const mayLieIn = (quadrant: Quadrant, clock: number, halfHours: number, eye: Eye): boolean =>
  hoursApart(clock, quadrantMiddle(quadrant, eye)) <= 1.5 + halfHours + 1e-9;

/** "4:30", "12 o’clock". */
export const showClock = (clock: number): string => {
  const minutes = Math.round((clock % 1) * 60);
  const hour = Math.floor(clock);
  return minutes === 0 ? `${hour} o’clock` : `${hour}:${String(minutes).padStart(2, '0')}`;
};
