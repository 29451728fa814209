import type { BuckleElement, CaseRecord, Eye, RetinalBreak } from '../../../src/domain/record/schema.ts';
import { type Detachment, isDetachedAt } from './detachment.ts';
import {
  apart,
  circumferenceMm,
  clockwise,
  equatorMm,
  insertionMm,
  oraMm,
  quadrantOf,
  wrap,
} from './globe.ts';
import { type Band, type Plan, type PlannedBreak, zoneOf } from './planned.ts';
import { type Random, round } from './random.ts';
import type { Scenario } from './scenario.ts';

interface Where {
  /** The vitreous has not come away: holes, no tears. */
  attached: boolean;
  random: Random;
  scenario: Scenario;
  eye: Eye;
  axialLengthMm: number;
  detachment: Detachment;
  band: Band | undefined;
}

export const bandFrontMm = (band: Band, clock: number, eye: Eye): number =>
  band.frontEdgeMm + (band.reference === 'insertions' ? insertionMm(clock, eye) : 0);

/** Edges of a break that lies wholly on the band. */
const edgesOnBand = (random: Random, band: Band, clock: number, eye: Eye, long: number) => {
  const bandFront = bandFrontMm(band, clock, eye);
  const length = Math.min(long, band.widthMm - 0.5);
  const front = round(bandFront + random.next() * (band.widthMm - length), 0.1);
  return { front: Math.max(front, round(bandFront + 0.05, 0.1)), back: round(front + length, 0.1) };
};

const freeEdges = (where: Where, clock: number, long: number) => {
  const { random, eye, axialLengthMm } = where;
  const front = round(oraMm(clock, eye) + random.stepped(2, 5, 0.5), 0.5);
  const far = random.chance(0.08) ? equatorMm(axialLengthMm) + random.stepped(1, 3, 0.5) : front;
  const start = round(where.scenario.vitrectomy ? far : front, 0.5);
  return { front: start, back: round(start + long, 0.5) };
};

const kindOf = ({ random, scenario, attached }: Where): PlannedBreak['kind'] => {
  if (attached) return 'round-hole';
  return scenario.disease === 'round-holes'
    ? random.weighted([
        [7, 'round-hole'],
        [1, 'operculated'],
        [1, 'horseshoe'],
      ])
    : random.weighted([
        [7, 'horseshoe'],
        [2, 'round-hole'],
        [1, 'operculated'],
      ]);
};

const ordinary = (where: Where, clock: number, leading: boolean): PlannedBreak => {
  const { random, scenario, band, eye, detachment } = where;
  const kind = leading && scenario.disease !== 'round-holes' ? 'horseshoe' : kindOf(where);
  const long = kind === 'horseshoe' ? random.stepped(1, 3.5, 0.5) : random.stepped(0.5, 1, 0.5);
  const extent = kind === 'horseshoe' ? random.stepped(0.25, 0.5, 0.25) : random.stepped(0.1, 0.2, 0.05);
  const local = scenario.buckle === 'band-and-segment' || scenario.buckle === 'band-and-under-band';
  const onBand = band !== undefined && !(leading && local) && (!scenario.vitrectomy || random.chance(0.7));
  if (onBand)
    return {
      kind,
      clock,
      extent,
      ...edgesOnBand(random, band, clock, eye, long),
      detached: isDetachedAt(detachment, clock),
    };
  const detached = isDetachedAt(detachment, clock);
  if (leading && local && band !== undefined) {
    // A little too long or too far back for the band alone.
    const front = round(bandFrontMm(band, clock, eye) + band.widthMm - random.stepped(0, 1, 0.5), 0.5);
    return {
      kind,
      clock,
      extent: 0.25,
      front,
      back: round(front + random.stepped(1.5, 3, 0.5), 0.5),
      detached,
    };
  }
  return { kind, clock, extent, ...freeEdges(where, clock, long), detached };
};

const moreBreaks = (where: Where): number => {
  const { random, scenario } = where;
  if (scenario.buckle === 'radial' || scenario.disease === 'break-only') return 0;
  if (scenario.name === 'pneumatic retinopexy') return random.chance(0.25) ? 1 : 0;
  if (scenario.buckle === 'segment') return random.pick([0, 0, 1, 1, 2]);
  return random.weighted([
    [45, 0],
    [28, 1],
    [14, 2],
    [8, 3],
    [4, random.whole(4, 7)],
  ]);
};

/** Places for further breaks: none on top of another, none on the border of the detachment. */
const moreClocks = (where: Where, first: number): number[] => {
  const { random, scenario, detachment } = where;
  const clocks: number[] = [first];
  const reach = scenario.name === 'pneumatic retinopexy' ? 0.75 : scenario.buckle === 'segment' ? 1.25 : 6;
  for (let wanted = moreBreaks(where), attempt = 0; wanted > 0 && attempt < 80; attempt += 1) {
    const clock = wrap(first + random.stepped(-reach, reach, 0.25));
    if (clocks.some((taken) => apart(taken, clock) < 0.75)) continue;
    // Out of reach of a bubble.
    if (scenario.name === 'pneumatic retinopexy' && clock > 4 && clock < 8) continue;
    const border = [detachment.from, detachment.to].some((at) => at !== undefined && apart(at, clock) < 0.5);
    const outside = !isDetachedAt(detachment, clock);
    if (border || (outside && (scenario.name === 'pneumatic retinopexy' || random.chance(0.6)))) continue;
    clocks.push(clock);
    wanted -= 1;
  }
  return clocks.slice(1);
};

/** One segment holds neighbouring breaks only when they lie equally far back. */
const beside = (found: PlannedBreak, leading: PlannedBreak): PlannedBreak => {
  const { front = 10, back = 11 } = leading;
  const length = Math.min((found.back ?? 11) - (found.front ?? 10), back - front);
  return { ...found, front, back: front + length };
};

export const planBreaks = (where: Where, clock: number): PlannedBreak[] => {
  const { random, scenario, eye, detachment } = where;
  switch (scenario.disease) {
    case 'macular-hole':
      return [{ kind: 'macular-hole', extent: 0, detached: true }];
    case 'dialysis': {
      const front = round(oraMm(clock, eye), 0.5);
      const extent = random.stepped(1, 2.5, 0.25);
      return [
        { kind: 'dialysis', clock, extent, front, back: front + random.stepped(1, 2, 0.5), detached: true },
      ];
    }
    case 'giant-tear': {
      const extent = random.stepped(3, 6, 0.25);
      const hours =
        detachment.total || detachment.from === undefined || detachment.to === undefined
          ? 12
          : clockwise(detachment.from, detachment.to);
      const centre = detachment.from === undefined ? clock : wrap(detachment.from + round(hours / 2, 0.25));
      const front = round(oraMm(centre, eye) + 1, 0.5);
      const size = Math.max(3, Math.min(extent, hours - 1.5));
      return [
        {
          kind: 'giant-tear',
          clock: centre,
          extent: round(size, 0.25),
          front,
          back: front + random.stepped(2, 5, 0.5),
          detached: true,
        },
      ];
    }
    case 'diabetic': {
      if (random.chance(0.5)) return [];
      const front = round(equatorMm(where.axialLengthMm) + random.stepped(3, 6, 0.5), 0.5);
      const at = wrap(random.stepped(4.5, 7.5, 0.25));
      return [{ kind: 'round-hole', clock: at, extent: 0.1, front, back: front + 0.5, detached: true }];
    }
    default: {
      const leading = ordinary(where, clock, true);
      const others = moreClocks(where, clock).map((at) => ordinary(where, at, false));
      return [
        leading,
        ...(scenario.buckle === 'segment' ? others.map((found) => beside(found, leading)) : others),
      ];
    }
  }
};

const span = (element: BuckleElement, clock: number, eye: Eye): [number, number] => {
  const at = element.meridianClock ?? clock;
  const own = element.frontEdgeByQuadrantMm?.[quadrantOf(clock, eye)] ?? element.frontEdgeMm ?? 0;
  const front = own + (element.frontEdgeReference === 'insertions' ? insertionMm(at, eye) : 0);
  const radial = element.role === 'meridional' || element.role === 'under-band';
  return [front, front + (radial ? (element.lengthMm ?? 0) : (element.widthMm ?? 0))];
};

/** Whether a break lies on an element, in both directions. */
export const holds = (
  element: BuckleElement,
  found: PlannedBreak,
  eye: Eye,
  axialLengthMm: number,
): boolean => {
  if (found.clock === undefined || found.front === undefined || found.back === undefined) return false;
  const [front, back] = span(element, found.clock, eye);
  if (found.front < front - 0.25 || found.back > back + 0.25) return false;
  if (element.fromClock !== undefined && element.toClock !== undefined) {
    const start = clockwise(element.fromClock, wrap(found.clock - found.extent / 2));
    return start + found.extent <= clockwise(element.fromClock, element.toClock) + 0.01;
  }
  if (element.meridianClock === undefined) return true;
  const hour = circumferenceMm(axialLengthMm, found.front) / 12;
  return (
    apart(element.meridianClock, found.clock) * hour + (found.extent / 2) * hour <= (element.widthMm ?? 0) / 2
  );
};

const localizedBy = (plan: Plan): NonNullable<RetinalBreak['localizedBy']> => {
  if (plan.scenario.name === 'pneumatic retinopexy') return ['indentation'];
  if (plan.scenario.buckle === 'none')
    return plan.random.pick([['internal-view'], ['indentation', 'internal-view']]);
  return plan.random.pick([
    ['indentation', 'diathermy-mark', 'measured'],
    ['indentation', 'diathermy-mark'],
    ['transillumination', 'measured'],
  ]);
};

type Treated = NonNullable<RetinalBreak['treatedBy']>;

/** The stage as recorded. */
export const breaksStage = (
  plan: Plan,
  elements: readonly BuckleElement[],
  treatedBy: readonly Treated[],
): NonNullable<CaseRecord['breaks']> => {
  const { random, eye, axialLengthMm } = plan;
  const found = plan.breaks.map((planned, index): RetinalBreak => {
    const numbers = elements.flatMap((element, at) =>
      holds(element, planned, eye, axialLengthMm) ? [at + 1] : [],
    );
    return {
      kind: planned.kind,
      ...(planned.clock === undefined
        ? {}
        : { clock: planned.clock, quadrant: quadrantOf(planned.clock, eye) }),
      ...(planned.kind === 'macular-hole' ? {} : { extentClockHours: planned.extent }),
      ...(planned.front === undefined ? {} : { frontEdgeMm: planned.front }),
      ...(planned.back === undefined ? {} : { backEdgeMm: planned.back }),
      zone: zoneOf(planned, axialLengthMm),
      localizedBy: localizedBy(plan),
      onDetachedRetina: planned.detached,
      treatedBy: treatedBy[index] ?? ['none'],
      supportedByElements: numbers.length === 0 ? 'none' : numbers,
    };
  });
  const leading = plan.breaks[0]?.clock;
  const patch =
    leading !== undefined && plan.scenario.disease === 'round-holes'
      ? random.chance(0.5)
      : random.chance(0.1);
  return {
    found: found.length === 0 ? 'none' : found,
    lattice:
      patch && leading !== undefined
        ? [{ fromClock: wrap(leading - 0.75), toClock: wrap(leading + 0.75), treated: true }]
        : 'none',
  };
};
