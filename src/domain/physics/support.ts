import { arcHours, clockwise, hoursApart, onArc, quadrantAt, wrapClock } from '../anatomy/clock.ts';
import { equatorMm, type Globe } from '../anatomy/globe.ts';
import { insertionMm } from '../anatomy/insertions.ts';
import { hourMm, zoneRangeMm } from '../anatomy/surface.ts';
import type { BuckleElement, Eye, RetinalBreak } from '../record/schema.ts';

/** Front and back edge, mm behind the limbus, that an element has at a clock hour. */
type Edges = readonly [front: number, back: number];

/** An element as it lies on the wall: its edges at each clock hour, `null` where it does not reach. */
export interface LyingElement {
  at: (clock: number) => Edges | null;
  arc: { from: number; to: number };
}

const frontMm = (element: BuckleElement, clock: number, eye: Eye): number | undefined => {
  const own = element.frontEdgeByQuadrantMm?.[quadrantAt(clock, eye)] ?? element.frontEdgeMm;
  if (own === undefined || element.frontEdgeReference === undefined) return undefined;
  return element.frontEdgeReference === 'insertions' ? insertionMm(clock, eye) + own : own;
};

const wholeRound = { from: 6, to: 6 };

/** How an element of a record lies; `undefined` while too little is recorded to tell. */
export const layElement = (element: BuckleElement, globe: Globe, eye: Eye): LyingElement | undefined => {
  const { role, widthMm, lengthMm, fromClock, toClock, meridianClock } = element;
  if (role === undefined || widthMm === undefined || frontMm(element, 12, eye) === undefined)
    return undefined;
  if (role === 'meridional' || (role === 'under-band' && meridianClock !== undefined)) {
    if (meridianClock === undefined || lengthMm === undefined) return undefined;
    const front = frontMm(element, meridianClock, eye) ?? 0;
    const half = widthMm / 2 / hourMm(globe, front + lengthMm / 2);
    return {
      at: (clock) => (hoursApart(clock, meridianClock) <= half ? [front, front + lengthMm] : null),
      arc: { from: wrapClock(meridianClock - half), to: wrapClock(meridianClock + half) },
    };
  }
  const arc =
    role === 'encircling'
      ? wholeRound
      : fromClock === undefined || toClock === undefined
        ? undefined
        : { from: fromClock, to: toClock };
  if (arc === undefined) return undefined;
  return {
    at: (clock) => {
      if (!onArc(clock, arc)) return null;
      const front = frontMm(element, clock, eye) ?? 0;
      return [front, front + widthMm];
    },
    arc,
  };
};

/** A break as it lies on the wall. */
export interface LyingBreak {
  clock: number;
  halfHours: number;
  frontMm: number;
  backMm: number;
  /** The edges were taken from the zone, because none were measured. */
  fromZone: boolean;
}

/** How a break of a record lies; `undefined` while neither edges nor zone are recorded. */
export const layBreak = (found: RetinalBreak, globe: Globe, eye: Eye): LyingBreak | undefined => {
  const { clock, zone, extentClockHours = 0, frontEdgeMm, backEdgeMm } = found;
  if (clock === undefined) return undefined;
  const halfHours = extentClockHours / 2;
  if (frontEdgeMm !== undefined || backEdgeMm !== undefined) {
    const front = frontEdgeMm ?? backEdgeMm ?? equatorMm(globe);
    return {
      clock,
      halfHours,
      frontMm: front,
      backMm: Math.max(front, backEdgeMm ?? front),
      fromZone: false,
    };
  }
  if (zone === undefined) return undefined;
  const [front, back] = zoneRangeMm(zone, globe, clock, eye);
  return { clock, halfHours, frontMm: front, backMm: back, fromZone: true };
};

/** How far elements reach beyond a break, mm and clock hours; negative: how far they fall short. */
export interface Support {
  frontMm: number;
  backMm: number;
  /** Counterclockwise and clockwise of the break; 12 for a whole round. */
  beforeHours: number;
  afterHours: number;
}

export const holds = ({ frontMm: front, backMm, beforeHours, afterHours }: Support): boolean =>
  front >= 0 && backMm >= 0 && beforeHours >= 0 && afterHours >= 0;

/** Support of a break by one element, `undefined` where it does not reach the break's clock hour. */
export const supportBy = (lying: LyingBreak, element: LyingElement): Support | undefined => {
  const edges = element.at(lying.clock);
  if (edges === null) return undefined;
  const round = arcHours(element.arc);
  const from = round === 12 ? 12 : clockwise(element.arc.from, wrapClock(lying.clock)) - lying.halfHours;
  const to = round === 12 ? 12 : clockwise(wrapClock(lying.clock), element.arc.to) - lying.halfHours;
  return {
    frontMm: lying.frontMm - edges[0],
    backMm: edges[1] - lying.backMm,
    beforeHours: from,
    afterHours: to,
  };
};

const SAMPLES = [-1, -0.5, 0, 0.5, 1] as const;

/** Length, mm, of [from, to] that none of the intervals covers; for a point, how far it lies from the nearest. */
const uncovered = (from: number, to: number, intervals: readonly Edges[]): number => {
  if (to <= from) {
    return Math.min(...intervals.map(([front, back]) => Math.max(0, front - from, from - back)));
  }
  let reached = from;
  let bare = 0;
  for (const [front, back] of [...intervals].sort((a, b) => a[0] - b[0])) {
    if (front >= to) break;
    if (front > reached) bare += front - reached;
    reached = Math.max(reached, back);
  }
  return bare + Math.max(0, to - reached);
};

export interface CombinedSupport {
  /** The widest gap in front-to-back cover over the break's own breadth, mm; 0 when it is held everywhere. */
  shortfallMm: number;
  /** Share of the break's breadth, 0 to 1, at whose clock hours no element lies at all. */
  bare: number;
}

/** Support of a break by all elements together, as a band with a meridional element under it. */
export const supportByAll = (lying: LyingBreak, elements: readonly LyingElement[]): CombinedSupport => {
  const at = lying.halfHours === 0 ? [0] : SAMPLES;
  let shortfallMm = 0;
  let bare = 0;
  for (const side of at) {
    const clock = wrapClock(lying.clock + side * lying.halfHours);
    const edges = elements.flatMap((element) => {
      const here = element.at(clock);
      return here === null ? [] : [here];
    });
    if (edges.length === 0) bare += 1;
    else shortfallMm = Math.max(shortfallMm, uncovered(lying.frontMm, lying.backMm, edges));
  }
  return {
    shortfallMm,
    bare: bare / at.length,
  };
};
