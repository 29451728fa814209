import type { CaseRecord, TamponadeAgent } from '../../../src/domain/record/schema.ts';
import { box } from './buckling.ts';
import { cavityMl } from './globe.ts';
import type { Plan } from './planned.ts';
import { round } from './random.ts';

type Tamponade = NonNullable<CaseRecord['tamponade']>;

export const gasAgents: readonly TamponadeAgent[] = ['air', 'SF6', 'C2F6', 'C3F8'];
export const isGas = (agent: TamponadeAgent | undefined): boolean =>
  agent !== undefined && gasAgents.includes(agent);
export const isOil = (agent: TamponadeAgent | undefined): boolean =>
  agent === 'silicone-oil' || agent === 'heavy-oil';

const notMixed = {
  viscosityCentistokes: 'not-applicable',
  mixing: 'not-applicable',
  concentrationPercent: 'not-applicable',
} as const;

/** A small bubble put in beside a buckle, or alone. */
const injected = (plan: Plan, drained: boolean): Tamponade => {
  const { random } = plan;
  const alone = plan.scenario.name === 'pneumatic retinopexy';
  const clock = { injectedAtClock: random.pick([10, 11, 1, 2, 12]) };
  if (plan.agent === 'air') {
    // Without drainage there is room only for what a paracentesis makes.
    const volumeMl = alone
      ? random.stepped(0.7, 1, 0.1)
      : drained
        ? random.stepped(0.4, 1, 0.1)
        : random.stepped(0.2, 0.3, 0.1);
    return {
      agent: 'air',
      ...notMixed,
      volumeMl,
      fillPercent: Math.round((volumeMl / cavityMl(plan.axialLengthMm)) * 100),
      exchange: 'injection',
      paracentesis: alone || !drained,
      ...(alone || !drained ? { paracentesisVolumeMl: random.stepped(0.2, 0.4, 0.1) } : {}),
      iridectomy: 'none',
      ...clock,
    };
  }
  const volumeMl = plan.agent === 'C3F8' ? 0.3 : random.pick([0.4, 0.5, 0.5, 0.6]);
  return {
    agent: plan.agent,
    viscosityCentistokes: 'not-applicable',
    mixing: 'pure',
    concentrationPercent: 100,
    volumeMl,
    fillPercent: Math.round((volumeMl / cavityMl(plan.axialLengthMm)) * 100),
    exchange: 'injection',
    ...box(plan),
    paracentesis: true,
    paracentesisVolumeMl: random.stepped(0.2, 0.3, 0.1),
    iridectomy: 'none',
    ...clock,
  };
};

const strength = (plan: Plan): number => {
  const { random } = plan;
  if (plan.agent === 'SF6')
    return random.weighted([
      [8, 20],
      [1, 18],
    ]);
  if (plan.agent === 'C2F6')
    return random.weighted([
      [4, 16],
      [1, 15],
    ]);
  return random.weighted([
    [5, 14],
    [2, 12],
    [1, 13],
    [1, 15],
  ]);
};

const fill = (plan: Plan, percent: number): Pick<Tamponade, 'volumeMl' | 'fillPercent'> => ({
  volumeMl: round((cavityMl(plan.axialLengthMm) * percent) / 100, 0.1),
  fillPercent: percent,
});

const mixed = (plan: Plan): Tamponade => {
  const { random } = plan;
  const concentrationPercent = strength(plan);
  const syringeMl = random.pick([50, 50, 60]);
  return {
    agent: plan.agent,
    viscosityCentistokes: 'not-applicable',
    mixing: 'diluted',
    concentrationPercent,
    pureMl: round((syringeMl * concentrationPercent) / 100, 0.1),
    syringeMl,
    ...fill(plan, random.stepped(85, 100, 5)),
    exchange: random.pick(['fluid-air-gas', 'fluid-air-gas', 'air-gas']),
    ...box(plan),
    paracentesis: false,
    iridectomy: 'none',
  };
};

const oil = (plan: Plan, usedHeavyLiquid: boolean): Tamponade => {
  const { random, agent } = plan;
  const aphakic = plan.lens === 'aphakic';
  return {
    agent,
    viscosityCentistokes:
      agent === 'heavy-oil'
        ? random.pick([1400, 3300])
        : random.weighted([
            [4, 1000],
            [3, 1300],
            [3, 5000],
          ]),
    mixing: 'not-applicable',
    concentrationPercent: 'not-applicable',
    ...fill(plan, random.stepped(90, 100, 5)),
    exchange: usedHeavyLiquid
      ? random.pick(['heavy-liquid-oil', 'air-oil'])
      : random.pick(['air-oil', 'fluid-oil']),
    ...box(plan),
    paracentesis: false,
    iridectomy: aphakic ? (agent === 'heavy-oil' ? 'superior' : 'inferior') : 'none',
  };
};

export const tamponadeStage = (plan: Plan, usedHeavyLiquid: boolean, drained: boolean): Tamponade => {
  const { agent, scenario } = plan;
  if (agent === 'none') {
    const soft = !scenario.vitrectomy && plan.random.chance(0.15);
    return {
      agent,
      ...notMixed,
      paracentesis: soft,
      ...(soft ? { paracentesisVolumeMl: 0.2 } : {}),
    };
  }
  if (!scenario.vitrectomy) return injected(plan, drained);
  if (isOil(agent)) return oil(plan, usedHeavyLiquid);
  if (agent !== 'air') return mixed(plan);
  return {
    agent,
    ...notMixed,
    ...fill(plan, plan.random.stepped(85, 100, 5)),
    exchange: 'fluid-air-gas',
    paracentesis: false,
    iridectomy: 'none',
  };
};
