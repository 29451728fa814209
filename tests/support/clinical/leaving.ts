import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { addDays, dateOf, daysBetween } from './calendar.ts';
import type { Written } from './ending.ts';
import type { Plan } from './planned.ts';
import { postureOf } from './posture.ts';
import { isGas, isOil } from './tamponade.ts';
import { allergicTo, type Clock } from './team.ts';

type Aftercare = NonNullable<CaseRecord['aftercare']>;

const drops = (plan: Plan, written: Written): Exclude<NonNullable<Aftercare['drops']>, 'none'> => {
  const { random, eye } = plan;
  const antibiotic = allergicTo(written.who, 'chloramphenicol')
    ? { drug: 'ofloxacin', strength: '0.3%' }
    : { drug: 'chloramphenicol', strength: '0.5%' };
  const steroid = random.pick([
    { drug: 'dexamethasone', strength: '0.1%' },
    { drug: 'prednisolone acetate', strength: '1%' },
  ]);
  const pupil = random.pick([
    { drug: 'cyclopentolate', strength: '1%', timesADay: 2 },
    { drug: 'atropine', strength: '1%', timesADay: 1 },
  ]);
  return [
    { ...antibiotic, timesADay: 4, weeks: random.pick([1, 2]), eye },
    { ...steroid, timesADay: random.pick([4, 6]), weeks: random.whole(3, 6), eye },
    ...(random.chance(0.6) ? [{ ...pupil, weeks: random.pick([1, 2]), eye }] : []),
  ];
};

const tablets = (plan: Plan, written: Written): Aftercare['tablets'] => {
  if (!allergicTo(written.who, 'sulfonamides') && plan.random.chance(0.15)) {
    return [{ drug: 'acetazolamide', strength: '250 mg', timesADay: 3, weeks: 0.5 }];
  }
  return plan.random.chance(0.4)
    ? [{ drug: 'paracetamol', strength: '1 g', timesADay: 4, weeks: 1, note: 'if sore' }]
    : 'none';
};

const gasAdvice = (plan: Plan): Partial<Aftercare> =>
  isGas(plan.agent)
    ? {
        flyingAdviceGiven: true,
        noFlyingUntil: 'surgeon-confirms',
        nitrousOxideAdviceGiven: true,
        wristband: true,
      }
    : {};

const later = (plan: Plan, written: Written): Partial<Aftercare> => {
  const { random, on } = plan;
  if (isOil(plan.agent)) {
    const months = plan.scenario.disease === 'pvr' ? random.pick([4, 5, 6]) : random.pick([3, 4, 6]);
    return {
      oilRemovalInMonths: months,
      ...(random.chance(0.25) ? { nextOperationOn: addDays(on, Math.round(months * 30.4)) } : {}),
    };
  }
  const out = written.vitreous.heavyLiquidRemovalPlannedOn;
  return out === undefined ? {} : { nextOperationOn: out };
};

export const aftercareStage = (plan: Plan, written: Written, clock: Clock): Aftercare => {
  const { random } = plan;
  const stays = plan.general && random.chance(0.5);
  const reviewAt = `${addDays(
    dateOf(clock.endedAt),
    random.weighted([
      [7, 1],
      [1, 2],
    ]),
  )}T${random.pick(['09:00', '09:30', '10:15', '14:00'])}`;
  return {
    posture: postureOf(plan, written.tamponade),
    ...gasAdvice(plan),
    drops: drops(plan, written),
    tablets: tablets(plan, written),
    shieldNights: random.pick([7, 14]),
    activity: random.pick([
      'no heavy lifting or sport for two weeks',
      'quiet life until reviewed; no swimming for four weeks',
    ]),
    driving: random.pick(['not-until-review', 'not-until-review', 'as-rules']),
    warningSigns: [
      'pain',
      'loss-of-sight',
      'new-shadow',
      'redness',
      ...(random.chance(0.5) ? (['nausea'] as const) : []),
    ],
    reviewAt,
    reviewInDays: daysBetween(dateOf(clock.endedAt), dateOf(reviewAt)),
    reviewPlace: random.pick(['retina clinic', 'eye ward', 'eye emergency clinic']),
    ...later(plan, written),
    ...(plan.scenario.temporary === true ? { elementRemovalInMonths: random.pick([2, 3]) } : {}),
    ...(plan.scenario.buckle === 'none' ? {} : { refractiveChangeTold: true }),
    goesTo: stays ? 'ward' : 'home',
  };
};
