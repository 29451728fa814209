/** A place on the unrolled globe: clock hour as the surgeon sees it, and millimetres behind the limbus. */
export interface GlobePoint {
  clock: number;
  mm: number;
}

export interface GlobeMuscle {
  name: string;
  clock: number;
  /** Half of its breadth at the insertion, in clock hours. */
  halfClockHours: number;
  insertionMm: number;
}

/** A part of the wall between two lines that run clockwise over the same hours. A whole ring starts and ends at 6. */
export interface GlobeArea {
  front: readonly GlobePoint[];
  back: readonly GlobePoint[];
}

export interface GlobeElement extends GlobeArea {
  path: string;
  fixations: readonly GlobePoint[];
}

export interface GlobeBreak {
  path: string;
  number: number;
  title: string;
  kind: string;
  clock: number;
  halfClockHours: number;
  frontMm: number;
  backMm: number;
  /** Its depth was measured, not taken from a zone or unknown. */
  sure: boolean;
  /** How far it lies from being on an element, in words; `null` when it is held, or when nothing can be told. */
  shortfall: string | null;
}

/** What the unrolled globe shows of one record. */
export interface GlobeModel {
  insertions: readonly GlobePoint[];
  /** Where the ora may lie. */
  ora: { from: readonly GlobePoint[]; to: readonly GlobePoint[] };
  equatorMm: number;
  poleMm: number;
  eye: 'right' | 'left';
  muscles: readonly GlobeMuscle[];
  detached: GlobeArea | null;
  elements: readonly GlobeElement[];
  breaks: readonly GlobeBreak[];
  /** Said to screen readers and where the picture cannot be seen. */
  summary: string;
}

export const globeWidth = 400;
export const deepest = 22;
const perMm = 8;

/** The picture with its scales: left and top edge, breadth and height, in units of the picture. */
export const globeLeft = -24;
export const globeTop = -16;
export const globeSpan = globeWidth + 32;
export const globeHeight = deepest * perMm + 12;

/** Least size at which a break can be seen. */
const least = 4.5;

/** Distance from the left edge, where 6 o'clock is; 12 lies in the middle, and 6 again at the right. */
export const xOf = (clock: number): number => ((((clock - 6) % 12) + 12) % 12) * (globeWidth / 12);

export const yOf = (mm: number): number => mm * perMm;

/** Clock hour and millimetres at a point of the picture, on half hours and half millimetres. */
export const snapped = (x: number, y: number): GlobePoint => {
  const hours = Math.round((x / (globeWidth / 12)) * 2) / 2;
  const clock = ((hours + 6 - 1) % 12) + 1;
  return { clock: clock < 1 ? clock + 12 : clock, mm: Math.max(0, Math.round((y / perMm) * 2) / 2) };
};

/** Corners of a line through points clockwise, in pieces where it goes round 6. */
const linePieces = (points: readonly GlobePoint[]): string[][] => {
  const pieces: string[][] = [[]];
  const add = (x: number, mm: number) => pieces.at(-1)?.push(`${x.toFixed(1)} ${yOf(mm).toFixed(1)}`);
  points.forEach(({ clock, mm }, index) => {
    if (clock !== 6 || index === 0) {
      add(xOf(clock), mm);
      return;
    }
    add(globeWidth, mm);
    if (index === points.length - 1) return;
    pieces.push([]);
    add(0, mm);
  });
  return pieces;
};

export const lineThrough = (points: readonly GlobePoint[]): string =>
  linePieces(points)
    .map((piece) => `M${piece.join('L')}`)
    .join('');

export const areaBetween = ({ front, back }: GlobeArea): string => {
  const backs = linePieces(back);
  return linePieces(front)
    .map((piece, index) => `M${[...piece, ...(backs[index] ?? []).reverse()].join('L')}Z`)
    .join('');
};

/** Half breadth and half height of a break in the picture: its own size, or the least that can be seen. */
export const breakSize = ({ halfClockHours, frontMm, backMm }: GlobeBreak): { rx: number; ry: number } => ({
  rx: Math.max(least, (halfClockHours * globeWidth) / 12),
  ry: Math.max(least, (yOf(backMm) - yOf(frontMm)) / 2),
});
