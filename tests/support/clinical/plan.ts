import type { Eye } from '../../../src/domain/record/schema.ts';
import { planBreaks } from './breaks.ts';
import { planDetachment, primaryClock } from './detachment.ts';
import type { Band, Plan, PlannedBreak } from './planned.ts';
import { type Random, randomFrom, round } from './random.ts';
import type { Scenario } from './scenario.ts';
import { scenarios } from './scenarios.ts';

const axialLength = (random: Random, scenario: Scenario): number => {
  if (scenario.disease === 'macular-hole') return random.stepped(28, 32, 0.01);
  return random.weighted([
    [70, random.stepped(22.6, 25.4, 0.01)],
    [16, random.stepped(25.4, 27.9, 0.01)],
    [8, random.stepped(28, 32, 0.01)],
    [4, random.stepped(20.6, 22.4, 0.01)],
  ]);
};

const posteriorVitreous = (random: Random, scenario: Scenario, age: number, redo: boolean): Plan['pvd'] => {
  if (redo && scenario.vitrectomy) return 'complete';
  switch (scenario.disease) {
    case 'giant-tear':
    case 'break-only':
      return 'complete';
    case 'dialysis':
      return 'none';
    case 'diabetic':
      return random.pick(['partial', 'none']);
    case 'round-holes':
      return age < 40 ? 'none' : random.pick(['none', 'partial', 'complete']);
    default:
      return random.weighted([
        [14, 'complete'],
        [3, 'partial'],
        [1, 'unknown'],
      ]);
  }
};

const planBand = (random: Random, axialLengthMm: number, age: number): Band => {
  const sizes: readonly (readonly [number, readonly [number, number]])[] =
    axialLengthMm < 22.5 || age > 62
      ? [
          [1, [2, 0.75]],
          [2, [2.5, 0.6]],
        ]
      : [
          [3, [2, 0.75]],
          [5, [2.5, 0.6]],
          [3, [3.5, 0.75]],
          [2, [4, 1.25]],
          [axialLengthMm > 26 ? 4 : 0.3, [5, 0.75]],
        ];
  const [widthMm, thicknessMm] = random.weighted(sizes);
  const reference = random.chance(0.8) ? 'insertions' : 'limbus';
  return {
    form: widthMm >= 5 ? 'strip' : 'band',
    widthMm,
    thicknessMm,
    reference,
    frontEdgeMm: reference === 'insertions' ? random.stepped(2, 3.5, 0.5) : random.stepped(9.5, 10.5, 0.5),
  };
};

/** Expanding gas beside a buckle is for breaks above, heavy oil for breaks below. */
const agentFor = (random: Random, scenario: Scenario, breaks: readonly PlannedBreak[]) => {
  const agent = random.weighted(scenario.agents);
  const clock = breaks[0]?.clock ?? 12;
  const low = breaks.every((found) => found.clock !== undefined && found.clock > 3 && found.clock < 9);
  if (agent === 'heavy-oil' && !low) return 'silicone-oil';
  const below = clock > 3.25 && clock < 8.75;
  return agent === 'SF6' && !scenario.vitrectomy && scenario.buckle !== 'none' && below ? 'none' : agent;
};

/** A case of any kind of operation; the same number gives the same case. */
export const planFrom = (start: number): Plan => {
  const random = randomFrom(start);
  const scenario = random.weighted(scenarios);
  const eye: Eye = random.pick(['right', 'left']);
  const age = random.whole(scenario.ages[0], scenario.ages[1]);
  const axialLengthMm = axialLength(random, scenario);
  const lens = random.weighted(
    scenario.lenses.filter(([, kind]) => age > 45 || kind === 'phakic' || kind === 'pseudophakic'),
  );
  const mayBeRedo = scenario.vitrectomy && !['break-only', 'diabetic'].includes(scenario.disease);
  const redo = scenario.disease === 'pvr' ? random.chance(0.65) : mayBeRedo && random.chance(0.1);
  const band =
    scenario.buckle === 'band' || scenario.buckle.startsWith('band-and')
      ? planBand(random, axialLengthMm, age)
      : undefined;
  const clock = primaryClock(random, scenario, eye);
  const detachment = planDetachment(random, scenario, clock, eye);
  const pvd = posteriorVitreous(random, scenario, age, redo);
  const where = { random, attached: pvd === 'none', scenario, eye, axialLengthMm, detachment, band };
  const breaks = planBreaks(where, clock);
  const heavyLiquidStays = ['giant-tear', 'pvr'].includes(scenario.disease) && random.chance(0.07);
  return {
    random,
    scenario,
    eye,
    age,
    on: random
      .pick(['2024', '2025', '2026'])
      .concat(
        `-${String(random.whole(1, 12)).padStart(2, '0')}-${String(random.whole(1, 28)).padStart(2, '0')}`,
      ),
    lens,
    axialLengthMm,
    keratometryDioptres: round(random.stepped(41, 46, 0.01), 0.01),
    redo,
    bandFromBefore: redo && band === undefined && random.chance(0.3),
    pvd,
    detachment,
    breaks,
    band,
    agent: heavyLiquidStays ? 'none' : agentFor(random, scenario, breaks),
    heavyLiquidStays,
    general: age < 18 || random.chance(scenario.name === 'pneumatic retinopexy' ? 0 : 0.35),
  };
};
