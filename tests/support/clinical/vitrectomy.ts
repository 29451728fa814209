import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { box } from './buckling.ts';
import { addDays } from './calendar.ts';
import { wrap } from './globe.ts';
import type { Plan } from './planned.ts';
import { round } from './random.ts';

type Vitreous = NonNullable<CaseRecord['vitreous']>;

const notDone: Vitreous = {
  vitrectomy: false,
  ports: 'not-applicable',
  gauge: 'not-applicable',
  dyes: 'none',
  heavyLiquid: 'none',
  membranesPeeled: ['none'],
  retinotomies: 'none',
  lensWork: 'none',
  lensImplant: 'not-applicable',
  sclerotomyClosure: 'not-applicable',
};

const peeling = (plan: Plan): Pick<Vitreous, 'membranesPeeled' | 'dyes'> => {
  const { random, scenario } = plan;
  const tripan = { kind: 'trypan-blue', purpose: 'membranes' } as const;
  const blue = { kind: 'brilliant-blue', purpose: 'internal limiting membrane' } as const;
  const triamcinolone = { kind: 'triamcinolone', purpose: 'posterior hyaloid and vitreous base' } as const;
  if (scenario.disease === 'pvr') {
    const more = random.weighted<NonNullable<Vitreous['membranesPeeled']>>([
      [6, ['preretinal']],
      [2, ['preretinal', 'ilm']],
      [2, ['preretinal', 'subretinal']],
    ]);
    return { membranesPeeled: more, dyes: more.includes('ilm') ? [tripan, blue] : [tripan] };
  }
  if (scenario.disease === 'macular-hole') return { membranesPeeled: ['ilm'], dyes: [triamcinolone, blue] };
  if (scenario.disease === 'diabetic')
    return { membranesPeeled: ['epiretinal'], dyes: [random.pick([tripan, triamcinolone])] };
  if (random.chance(0.06)) return { membranesPeeled: ['epiretinal', 'ilm'], dyes: [blue] };
  return { membranesPeeled: ['none'], dyes: random.chance(0.35) ? [triamcinolone] : 'none' };
};

const heavyLiquid = (plan: Plan) => {
  const { random, scenario } = plan;
  if (plan.heavyLiquidStays) {
    return {
      heavyLiquid: 'left' as const,
      heavyLiquidVolumeMl: random.stepped(3, 4.5, 0.5),
      heavyLiquidRemovalPlannedOn: addDays(plan.on, random.whole(7, 14)),
    };
  }
  const chance = scenario.disease === 'giant-tear' ? 1 : scenario.disease === 'pvr' ? 0.7 : 0.2;
  return random.chance(chance)
    ? { heavyLiquid: 'removed' as const, heavyLiquidVolumeMl: random.stepped(2, 4.5, 0.5) }
    : { heavyLiquid: 'none' as const };
};

const retinotomies = (plan: Plan): Pick<Vitreous, 'retinotomies'> => {
  const { random, scenario } = plan;
  if (scenario.disease === 'pvr' && random.chance(0.35)) {
    const start = wrap(random.stepped(3, 5, 0.5));
    return {
      retinotomies: [
        {
          kind: random.pick(['retinectomy', 'relaxing']),
          fromClock: start,
          toClock: wrap(start + random.stepped(3, 5, 0.5)),
          treatedBy: 'laser',
        },
      ],
    };
  }
  if (scenario.disease === 'tears' && !plan.detachment.total && random.chance(0.1)) {
    const { from } = plan.detachment;
    if (from !== undefined) {
      const at = wrap(from + 0.75);
      return { retinotomies: [{ kind: 'drainage', fromClock: at, toClock: at, treatedBy: 'laser' }] };
    }
  }
  return { retinotomies: 'none' };
};

/** Power for a target near emmetropia, from the published regression constants of an invented lens. */
const lensPower = (plan: Plan): number =>
  round(118.7 - 2.5 * plan.axialLengthMm - 0.9 * plan.keratometryDioptres - 0.3, 0.5);

const lensWork = (plan: Plan): Pick<Vitreous, 'lensWork' | 'lensImplant'> => {
  const { random } = plan;
  const takesLens =
    (plan.lens === 'cataract' && random.chance(0.75)) ||
    (plan.lens === 'phakic' && plan.age > 60 && random.chance(0.3));
  if (!takesLens) return { lensWork: 'none', lensImplant: 'not-applicable' };
  return {
    lensWork: 'phacoemulsification',
    lensImplant: {
      form: random.pick(['one-piece hydrophobic acrylic', 'three-piece acrylic']),
      powerDioptres: lensPower(plan),
      position: 'bag',
      ...box(plan),
      axialLengthUsedMm: plan.axialLengthMm,
    },
  };
};

export const vitreousStage = (plan: Plan): Vitreous => {
  const { random, scenario } = plan;
  if (!scenario.vitrectomy) return notDone;
  const gauge = random.weighted<'20' | '23' | '25' | '27'>([
    [0.3, '20'],
    [5, '23'],
    [6, '25'],
    [1, '27'],
  ]);
  const oily = plan.agent === 'silicone-oil' || plan.agent === 'heavy-oil';
  return {
    vitrectomy: true,
    ports: random.chance(0.12) ? 4 : 3,
    gauge,
    sclerotomiesMm: plan.lens === 'pseudophakic' || plan.lens === 'aphakic' ? 3.5 : 4,
    hyaloid: plan.pvd === 'complete' ? 'already-detached' : 'induced',
    baseShaved: random.pick(['shaved-under-indentation', 'shaved-under-indentation', 'shaved']),
    ...peeling(plan),
    ...heavyLiquid(plan),
    ...retinotomies(plan),
    ...lensWork(plan),
    sclerotomyClosure:
      gauge === '20' || oily
        ? random.pick(['sutured', 'sutured'])
        : random.pick(['sutureless', 'sutureless', 'some-sutured', 'sutured']),
  };
};

/** Drainage fits what the vitreous stage says of retinotomies. */
export const drainageStage = (plan: Plan, vitreous: Vitreous): NonNullable<CaseRecord['drainage']> => {
  const { random, scenario, detachment } = plan;
  if (scenario.disease === 'break-only' || scenario.name === 'pneumatic retinopexy') return { kind: 'none' };
  if (scenario.vitrectomy) {
    const hole = Array.isArray(vitreous.retinotomies)
      ? vitreous.retinotomies.find((cut) => cut.kind === 'drainage')
      : undefined;
    if (plan.breaks.length === 0) return { kind: 'none' };
    return {
      kind: 'internal',
      internalThrough: hole === undefined ? 'break' : 'retinotomy',
      ...(hole?.fromClock === undefined ? {} : { clock: hole.fromClock }),
      ...(hole === undefined && plan.breaks[0]?.clock !== undefined ? { clock: plan.breaks[0].clock } : {}),
      outcome: random.weighted([
        [9, 'complete'],
        [1, 'partial'],
      ]),
    };
  }
  const small = !detachment.total && detachment.quadrants < 2;
  if (random.chance(small ? 0.65 : 0.35)) return { kind: 'none' };
  const middle =
    detachment.from === undefined || detachment.to === undefined
      ? 8
      : wrap(
          detachment.from +
            round(((detachment.to - detachment.from + 12) % 12 || 12) * random.pick([0.35, 0.5, 0.65]), 0.25),
        );
  return {
    kind: 'external',
    externalMethod: random.pick(['needle', 'needle', 'cut-down', 'laser']),
    clock: middle,
    outcome: random.weighted([
      [6, 'complete'],
      [4, 'partial'],
      [0.3, 'dry'],
    ]),
  };
};
