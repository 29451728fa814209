import type { Eye } from '../record/schema.ts';
import { wrapClock } from './clock.ts';

export type Rectus = 'medial' | 'superior' | 'lateral' | 'inferior';

/** Insertions behind the limbus, mm. Spiral of Tillaux, IOVS 2022;63:1877 (read). */
export const insertionsMm: Readonly<Record<Rectus, number>> = {
  medial: 5.5,
  inferior: 6.5,
  lateral: 6.9,
  superior: 7.7,
};

/** Breadth of an insertion, mm, the same for all four (from memory, about 9 to 11). */
export const INSERTION_BREADTH_MM = 10;

/** Ora serrata behind the limbus, mm: two texts that disagree, so a range. Between nasal and temporal it is interpolated. */
export const oraRangesMm = { nasal: [5, 7.5], temporal: [7, 8.5] } as const;

/** Where the vortex veins leave the wall, mm behind the limbus (read). */
export const vortexRangeMm = [14, 18] as const;

/** Clock hour of each rectus. */
export const rectusClock = (rectus: Rectus, eye: Eye): number => {
  if (rectus === 'superior') return 12;
  if (rectus === 'inferior') return 6;
  return (rectus === 'lateral') === (eye === 'left') ? 3 : 9;
};

/** Value between four that are known at 12, 3, 6 and 9, joined by half a cosine so that the curve has no corners. */
const between = (at: readonly [number, number, number, number], clock: number): number => {
  const place = (wrapClock(clock) % 12) / 3;
  const before = Math.floor(place);
  const from = at[before % 4] ?? 0;
  const to = at[(before + 1) % 4] ?? 0;
  return from + ((to - from) * (1 - Math.cos((place - before) * Math.PI))) / 2;
};

/** The line of the insertions, mm behind the limbus at a clock hour: the spiral, carried on between the muscles. */
export const insertionMm = (clock: number, eye: Eye): number => {
  const { superior, medial, inferior, lateral } = insertionsMm;
  return eye === 'left'
    ? between([superior, lateral, inferior, medial], clock)
    : between([superior, medial, inferior, lateral], clock);
};

/** Where the ora may lie at a clock hour, mm behind the limbus. */
export const oraRangeMm = (clock: number, eye: Eye): readonly [number, number] => {
  const { nasal, temporal } = oraRangesMm;
  const at = (end: 0 | 1) => {
    const middle = (nasal[end] + temporal[end]) / 2;
    return eye === 'left'
      ? between([middle, temporal[end], middle, nasal[end]], clock)
      : between([middle, nasal[end], middle, temporal[end]], clock);
  };
  return [at(0), at(1)];
};
