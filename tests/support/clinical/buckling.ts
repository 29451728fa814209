import type { BuckleElement, CaseRecord, Fixation } from '../../../src/domain/record/schema.ts';
import { bandFrontMm } from './breaks.ts';
import { addDays } from './calendar.ts';
import { detachedHours, isDetachedAt } from './detachment.ts';
import {
  apart,
  circumferenceMm,
  clockwise,
  insertionMm,
  type Muscle,
  muscleClock,
  quadrantOf,
  quadrantsClockwise,
  within,
  wrap,
} from './globe.ts';
import type { Band, Plan, PlannedBreak } from './planned.ts';
import { round } from './random.ts';

const letters = ['K', 'M', 'R', 'T', 'W'] as const;

/** Number, lot and expiry of something that comes out of a box. */
export const box = (plan: Plan) => ({
  lot: `${plan.random.pick(letters)}${plan.random.whole(10000, 99999)}`,
  expiresOn: addDays(plan.on, plan.random.whole(40, 1400)),
});

const all: Muscle[] = ['medial', 'superior', 'lateral', 'inferior'];

const lasting = (plan: Plan) =>
  plan.random.pick(['nylon', 'polyester', 'polyester', 'polypropylene'] as const);

const mattress = (plan: Plan, clock: number, biteMm: number): Fixation => ({
  quadrant: quadrantOf(clock, plan.eye),
  kind: 'mattress-suture',
  material: lasting(plan),
  gauge: plan.random.pick(['5-0', '5-0', '4-0']),
  biteMm,
  overDetachedRetina: isDetachedAt(plan.detachment, clock),
});

const bandFixation = (plan: Plan, band: Band): Fixation[] => {
  const tunnels = plan.random.chance(0.35);
  const absorbable = plan.scenario.temporary === true && plan.random.chance(0.4);
  const material = absorbable ? 'polyglactin-910' : lasting(plan);
  return quadrantsClockwise(plan.eye).map((quadrant): Fixation => {
    const hours = detachedHours(plan.detachment, quadrant, plan.eye);
    const overDetachedRetina = hours >= 2.5 || (hours > 0.5 && plan.random.chance(0.5));
    return tunnels
      ? {
          quadrant,
          kind: 'scleral-tunnel',
          material: 'not-applicable',
          gauge: 'not-applicable',
          biteMm: band.widthMm + 0.5,
          overDetachedRetina,
        }
      : {
          quadrant,
          kind: 'mattress-suture',
          material,
          gauge: absorbable ? '6-0' : '5-0',
          biteMm: band.widthMm + 2,
          overDetachedRetina,
        };
  });
};

const bandClosure = (plan: Plan): NonNullable<BuckleElement['closure']> => {
  const { random, scenario } = plan;
  const quadrant = random.pick(['superonasal', 'superotemporal', 'inferonasal', 'inferotemporal'] as const);
  const common = { quadrant, endsMatch: true };
  if (scenario.temporary === true) {
    return { ...common, kind: 'knot', material: random.pick(['polyglactin-910', 'polydioxanone'] as const) };
  }
  return random.weighted([
    [7, { ...common, kind: 'sleeve', material: 'silicone' }],
    [2, { ...common, kind: 'clip', material: 'metal' }],
    [2, { ...common, kind: 'suture', material: random.pick(['nylon', 'polyester'] as const) }],
    [1, { ...common, kind: 'knot', material: 'polyester' }],
  ]);
};

const tensioning = (plan: Plan) => {
  const { random, scenario } = plan;
  if (scenario.vitrectomy) {
    return {
      pressureWhileTensioningMmHg: random.stepped(30, 60, 5),
      pressureSetBy: 'infusion' as const,
    };
  }
  return random.weighted([
    [3, { pressureWhileTensioningMmHg: random.stepped(35, 60, 5), pressureSetBy: 'injection' as const }],
    [3, { pressureWhileTensioningMmHg: random.stepped(25, 55, 5), pressureSetBy: 'tonometer' as const }],
    [2, { pressureWhileTensioningMmHg: random.pick([30, 40, 50]), pressureSetBy: 'palpation' as const }],
  ]);
};

const encircling = (plan: Plan, band: Band): BuckleElement => {
  const { random } = plan;
  const shortenedMm = plan.scenario.temporary === true ? random.stepped(3, 8, 1) : random.stepped(3, 11, 0.5);
  const round360 = circumferenceMm(plan.axialLengthMm, bandFrontMm(band, 12, plan.eye));
  const ideal = shortenedMm / (2 * Math.PI);
  return {
    role: 'encircling',
    form: band.form,
    material: 'solid-silicone',
    widthMm: band.widthMm,
    thicknessMm: band.thicknessMm,
    ...(random.chance(0.4) ? { lengthMm: round(round360 - shortenedMm + random.whole(1, 5), 0.5) } : {}),
    catalogueNumber: `EL-${random.whole(100, 999)}`,
    ...box(plan),
    frontEdgeReference: band.reference,
    frontEdgeMm: band.frontEdgeMm,
    underMuscles: all,
    fixation: bandFixation(plan, band),
    closure: bandClosure(plan),
    intention: plan.scenario.temporary === true ? 'temporary' : 'permanent',
    shortenedMm,
    ...tensioning(plan),
    heightMm: Math.max(0.25, Math.floor(ideal * (0.7 + 0.3 * random.next()) * 4) / 4),
  };
};

const musclesBetween = (plan: Plan, from: number, to: number): Muscle[] =>
  all.filter((muscle) => within(muscleClock(plan.eye)[muscle], from, to));

type Shape = readonly [number, Pick<BuckleElement, 'form' | 'material' | 'widthMm' | 'thicknessMm'>];

const sponge = (form: 'round-sponge' | 'oval-sponge', widthMm: number, thicknessMm: number) => ({
  form,
  material: 'silicone-sponge' as const,
  widthMm,
  thicknessMm,
});
const solid = (form: 'strip' | 'tyre' | 'wedge', widthMm: number, thicknessMm: number) => ({
  form,
  material: 'solid-silicone' as const,
  widthMm,
  thicknessMm,
});

const wideEnough = (plan: Plan, shapes: readonly Shape[], widthMm: number) => {
  const fitting = shapes.filter(([, shape]) => (shape.widthMm ?? 0) >= widthMm);
  return plan.random.weighted(fitting.length === 0 ? shapes.slice(-1) : fitting);
};

const segment = (plan: Plan, held: readonly PlannedBreak[]): BuckleElement => {
  const { random, eye } = plan;
  const leading = held[0];
  const clock = leading?.clock ?? 12;
  const shape = wideEnough(
    plan,
    [
      [2, solid('strip', 5, 1.25)],
      [2, sponge('round-sponge', 5, 5)],
      [3, solid('tyre', 7, 2.75)],
      [3, sponge('oval-sponge', 7.5, 5.5)],
      ...(plan.age > 60 ? [] : [[1, solid('tyre', 9, 3)] as const]),
    ],
    (leading?.back ?? 0) - (leading?.front ?? 0) + 1.5,
  );
  const spare = (shape.widthMm ?? 0) - ((leading?.back ?? 0) - (leading?.front ?? 0));
  const front = (leading?.front ?? 10) - Math.min(2.5, spare / 2);
  const reference = random.chance(0.65) ? 'insertions' : 'limbus';
  const clocks = held.map((found) => clockwise(wrap(clock - 6), found.clock ?? clock));
  const half = Math.max(...held.map((found) => found.extent / 2));
  const pad = random.stepped(0.75, 1.25, 0.25);
  const fromClock = wrap(wrap(clock - 6) + round(Math.min(...clocks) - half - pad, 0.25));
  const toClock = wrap(wrap(clock - 6) + round(Math.max(...clocks) + half + pad, 0.25));
  const hours = clockwise(fromClock, toClock);
  const bites = Math.max(2, Math.round(hours / 1.5));
  return {
    role: 'segment',
    ...shape,
    lengthMm: round((circumferenceMm(plan.axialLengthMm, front) / 12) * hours, 1),
    catalogueNumber: `EL-${random.whole(100, 999)}`,
    ...box(plan),
    frontEdgeReference: reference,
    frontEdgeMm: Math.max(0, round(reference === 'limbus' ? front : front - insertionMm(clock, eye), 0.5)),
    underMuscles: musclesBetween(plan, fromClock, toClock),
    fromClock,
    toClock,
    fixation: Array.from({ length: bites }, (_, at) =>
      mattress(plan, wrap(fromClock + (hours * (at + 0.5)) / bites), (shape.widthMm ?? 0) + 2),
    ),
    closure: 'not-applicable',
    intention: 'permanent',
    heightMm: random.stepped(1, 2.5, 0.25),
  };
};

const radial = (plan: Plan, held: PlannedBreak, role: 'meridional' | 'under-band'): BuckleElement => {
  const { random, eye } = plan;
  const clock = held.clock ?? 12;
  const front = round((held.front ?? 10) - random.stepped(1, 2, 0.5), 0.5);
  const across = held.extent * (circumferenceMm(plan.axialLengthMm, held.front ?? 10) / 12);
  const shape = wideEnough(
    plan,
    role === 'under-band'
      ? [
          [2, solid('wedge', 4, 1.5)],
          [2, solid('wedge', 5, 2)],
        ]
      : [
          [2, sponge('round-sponge', 4, 4)],
          [3, sponge('round-sponge', 5, 5)],
          [2, sponge('oval-sponge', 7.5, 5.5)],
        ],
    across + 1,
  );
  const reference = random.chance(0.3) ? 'insertions' : 'limbus';
  const own = reference === 'limbus' ? front : Math.floor((front - insertionMm(clock, eye)) * 2) / 2;
  const under = all.filter((muscle) => apart(muscleClock(eye)[muscle], clock) < 0.75);
  return {
    role,
    ...shape,
    lengthMm: Math.ceil((held.back ?? 12) - front + random.stepped(1.5, 3, 0.5)),
    catalogueNumber: `EL-${random.whole(100, 999)}`,
    ...box(plan),
    frontEdgeReference: reference,
    frontEdgeMm: Math.max(0, own),
    ...(under.length === 0 ? {} : { underMuscles: under }),
    meridianClock: clock,
    fixation:
      role === 'under-band'
        ? [mattress(plan, clock, (shape.widthMm ?? 0) + 2)]
        : [mattress(plan, clock, (shape.widthMm ?? 0) + 2), mattress(plan, clock, (shape.widthMm ?? 0) + 2)],
    closure: 'not-applicable',
    intention: 'permanent',
    heightMm: random.stepped(1, 2.5, 0.25),
  };
};

export const plannedElements = (plan: Plan): BuckleElement[] => {
  const [leading, ...others] = plan.breaks;
  const band = plan.band === undefined ? [] : [encircling(plan, plan.band)];
  if (leading === undefined) return band;
  switch (plan.scenario.buckle) {
    case 'segment':
      return [segment(plan, [leading, ...others])];
    case 'radial':
      return [radial(plan, leading, 'meridional')];
    case 'band-and-segment':
      return [...band, segment(plan, [leading])];
    case 'band-and-under-band':
      return [...band, radial(plan, leading, 'under-band')];
    default:
      return band;
  }
};

export const buckleStage = (plan: Plan, elements: BuckleElement[]): NonNullable<CaseRecord['buckle']> => {
  const { random } = plan;
  if (elements.length === 0) {
    return {
      elements: 'none',
      peritomy: 'none',
      muscleSlings: 'none',
      conjunctivalClosure: 'not-applicable',
    };
  }
  const clock = plan.breaks[0]?.clock ?? 12;
  const nearest = all
    .filter((muscle) => apart(muscleClock(plan.eye)[muscle], clock) < 3.5)
    .concat(elements.flatMap((element) => element.underMuscles ?? []));
  return {
    elements,
    peritomy: plan.band === undefined ? 'limited' : 'full-circle',
    muscleSlings: plan.band === undefined ? all.filter((muscle) => nearest.includes(muscle)) : all,
    conjunctivalClosure: random.weighted([
      [8, 'polyglactin-910'],
      [1, 'plain-gut'],
      [1, 'glue'],
    ]),
  };
};
