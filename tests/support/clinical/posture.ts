import type { CaseRecord, Posture } from '../../../src/domain/record/schema.ts';
import { bubbleHalfArc, cavityMl, fromTop } from './globe.ts';
import type { Plan } from './planned.ts';
import { isOil } from './tamponade.ts';

type Position = Exclude<NonNullable<Posture['position']>, 'free'>;
type Tamponade = NonNullable<CaseRecord['tamponade']>;

const choicesInOrder: readonly (readonly Position[])[] = [
  ['upright'],
  ['left-side'],
  ['right-side'],
  ['left-cheek'],
  ['right-cheek'],
  ['face-down'],
  ['face-down', 'upright'],
  ['face-down', 'left-side'],
  ['face-down', 'right-side'],
  ['left-side', 'right-side'],
  ['left-side', 'upright'],
  ['right-side', 'upright'],
];

const growth = { air: 1, SF6: 2, C2F6: 3, C3F8: 4 } as const;

/** Half the arc wetted by the bubble when it is largest, degrees. */
const reach = (plan: Plan, tamponade: Tamponade): number => {
  const own = tamponade.volumeMl ?? 0;
  const times = tamponade.mixing === 'pure' ? growth[plan.agent as keyof typeof growth] : 1;
  return bubbleHalfArc(Math.min((own * times) / cavityMl(plan.axialLengthMm), 0.97));
};

/** Positions in which every break lies under the bubble at some time of the day, the breaks as high as possible. */
const positionsFor = (plan: Plan, tamponade: Tamponade): readonly Position[] => {
  const { random, axialLengthMm, scenario } = plan;
  const beside = !scenario.vitrectomy && scenario.buckle !== 'none';
  const places = (beside ? plan.breaks.slice(0, 1) : plan.breaks).flatMap((found) =>
    found.clock === undefined || found.front === undefined || found.back === undefined
      ? []
      : [{ clock: found.clock, mm: (found.front + found.back) / 2 }],
  );
  const worst = (positions: readonly Position[]) =>
    Math.max(...places.map((place) => Math.min(...positions.map((at) => fromTop(at, place, axialLengthMm)))));
  const half = reach(plan, tamponade);
  const reached = Math.min(60, half - 8);
  /** Nobody is asked to lie in a position that does nothing for any break; face down is for the macula. */
  const needed = (positions: readonly Position[]) =>
    positions.length === 1 ||
    positions.every((at) => at === 'face-down' || worst(positions.filter((other) => other !== at)) > reached);
  const highest = choicesInOrder.filter((positions) => worst(positions) <= reached && needed(positions));
  if (highest.length > 0) return random.pick(highest.slice(0, 3));
  // A little air beside a buckle only restores the volume.
  if (beside) return [];
  const wetted = choicesInOrder.filter(needed).sort((a, b) => worst(a) - worst(b));
  return wetted[0] ?? ['face-down'];
};

const course = (plan: Plan, position: Position, days: number): Posture =>
  plan.random.chance(0.5)
    ? { position, minutesAnHour: plan.random.pick([45, 50, 50]), days }
    : { position, hoursADay: plan.random.pick([12, 14, 16, 18]), days };

/** Two positions: face down first and then the other, or the one by day and the other by night. */
const twoCourses = (plan: Plan, first: Position, second: Position, days: number): Posture[] =>
  first === 'face-down'
    ? [course(plan, first, 1), course(plan, second, days)]
    : [
        { position: first, hoursADay: plan.random.pick([8, 10]), days },
        { position: second, hoursADay: plan.random.pick([6, 8]), days },
      ];

const daysFor = (plan: Plan): number => {
  const { random } = plan;
  if (plan.band !== undefined) return random.whole(1, 3);
  if (plan.agent === 'air') return random.whole(1, 4);
  return plan.agent === 'SF6' ? random.whole(3, 7) : random.whole(5, 10);
};

export const postureOf = (
  plan: Plan,
  tamponade: Tamponade,
): NonNullable<CaseRecord['aftercare']>['posture'] => {
  const { random, agent, scenario } = plan;
  if (plan.heavyLiquidStays) return [course(plan, 'supine', 7)];
  if (agent === 'none') return 'none';
  if (agent === 'heavy-oil') return [course(plan, 'upright', random.whole(3, 7))];
  if (scenario.disease === 'macular-hole' || scenario.disease === 'diabetic') {
    return [course(plan, 'face-down', random.whole(3, 7))];
  }
  if (isOil(agent)) {
    return random.chance(0.2) && scenario.disease !== 'giant-tear'
      ? [course(plan, 'face-down', 1), { position: 'free', days: 7 }]
      : [course(plan, 'face-down', random.whole(1, 7))];
  }
  if (scenario.disease === 'giant-tear') {
    return [course(plan, 'face-down', random.whole(2, 5))];
  }
  const positions = positionsFor(plan, tamponade);
  const [first, second] = positions;
  if (first === undefined) return 'none';
  return second === undefined
    ? [course(plan, first, daysFor(plan))]
    : twoCourses(plan, first, second, daysFor(plan));
};
