import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { addDays, daysBetween } from './calendar.ts';
import { clockwise } from './globe.ts';
import type { Plan } from './planned.ts';
import { round } from './random.ts';

type Before = NonNullable<CaseRecord['before']>;
type Previous = Exclude<NonNullable<Before['previousOperations']>, 'none'>[number];

const diagnosisOf = (plan: Plan): NonNullable<Before['diagnosis']> => {
  switch (plan.scenario.disease) {
    case 'giant-tear':
    case 'dialysis':
      return plan.scenario.disease;
    case 'diabetic':
      return plan.breaks.length === 0 ? 'tractional' : 'combined';
    case 'break-only':
      return 'break-without-detachment';
    default:
      return 'rhegmatogenous';
  }
};

const macula = (plan: Plan): NonNullable<Before['macula']> => {
  const { random, detachment, scenario } = plan;
  if (scenario.disease === 'break-only') return 'on';
  if (detachment.total || scenario.disease === 'macular-hole' || scenario.disease === 'pvr') return 'off';
  const hours =
    detachment.from === undefined || detachment.to === undefined
      ? 12
      : clockwise(detachment.from, detachment.to);
  if (hours <= 4) return random.chance(0.85) ? 'on' : 'off';
  if (hours >= 7) return 'off';
  return random.weighted([
    [4, 'on'],
    [5, 'off'],
    [1, 'split'],
  ]);
};

const acuities = {
  on: ['6/5', '6/6', '6/9', '6/12'],
  split: ['6/12', '6/24', '6/36'],
  off: ['6/60', 'counting fingers', 'hand movements'],
} as const;

const pvr = (plan: Plan): NonNullable<Before['pvr']> => {
  const { random, scenario, detachment } = plan;
  const edition = random.weighted<'1983' | '1991'>([
    [1, '1983'],
    [3, '1991'],
  ]);
  if (scenario.disease === 'pvr') {
    if (edition === '1991') {
      return {
        edition,
        grade: random.pick(['CP', 'CP', 'CA']),
        clockHours: random.whole(2, detachment.total ? 10 : 5),
      };
    }
    const grade = detachment.total
      ? random.pick(['C3', 'D1', 'D2'] as const)
      : random.pick(['C1', 'C2'] as const);
    return { edition, grade, clockHours: 'not-applicable' };
  }
  const mild = random.weighted<'none' | 'A' | 'B'>([
    [7, 'none'],
    [2, 'A'],
    [scenario.disease === 'break-only' ? 0 : 1, 'B'],
  ]);
  return { edition, grade: mild, clockHours: 'not-applicable' };
};

const previous = (plan: Plan): Previous[] => {
  const { random, eye, on, scenario } = plan;
  const found: Previous[] = [];
  const fellow = eye === 'right' ? 'left' : 'right';
  if (plan.lens === 'pseudophakic' || plan.lens === 'aphakic') {
    found.push({ what: 'cataract', eye, on: addDays(on, -random.whole(500, 4000)) });
    if (random.chance(0.5))
      found.push({ what: 'cataract', eye: fellow, on: addDays(on, -random.whole(500, 4000)) });
  }
  if (plan.bandFromBefore)
    found.push({ what: 'encircling-band', eye, on: addDays(on, -random.whole(60, 450)) });
  else if (plan.redo) {
    const what =
      scenario.buckle === 'none' ? random.pick(['vitrectomy', 'scleral-buckle'] as const) : 'vitrectomy';
    found.push({ what, eye, on: addDays(on, -random.whole(25, 400)) });
  }
  if (random.chance(0.05)) {
    found.push({
      what: random.pick(['vitrectomy', 'laser'] as const),
      eye: fellow,
      on: addDays(on, -random.whole(40, 3000)),
    });
  }
  if (scenario.disease === 'diabetic' && random.chance(0.7)) {
    found.push({ what: 'laser', eye, on: addDays(on, -random.whole(90, 1500)), note: 'panretinal' });
  }
  return found;
};

const anticoagulants = (plan: Plan): Before['anticoagulants'] =>
  plan.age < 50
    ? 'none'
    : plan.random.weighted<Before['anticoagulants']>([
        [8, 'none'],
        [1, [{ drug: 'aspirin', action: 'continued' }]],
        [1, [{ drug: 'apixaban', action: plan.random.pick(['continued', 'stopped']) }]],
        [0.4, [{ drug: 'warfarin', action: 'continued' }]],
      ]);

/** Days between the first symptoms and the operation. */
export const symptomDays = (plan: Plan): number => {
  if (plan.scenario.disease === 'dialysis' || plan.scenario.disease === 'round-holes')
    return plan.random.whole(3, 90);
  if (plan.scenario.disease === 'pvr' || plan.scenario.disease === 'diabetic')
    return plan.random.whole(14, 90);
  return plan.random.whole(1, 14);
};

export const beforeStage = (plan: Plan, symptomsSince: string): Before => {
  const { random, on, detachment, scenario } = plan;
  const state = macula(plan);
  const days = daysBetween(symptomsSince, on);
  const earlier = previous(plan);
  const measured = addDays(on, -random.whole(0, Math.min(days, 5)));
  const phakic = plan.lens === 'phakic' || plan.lens === 'cataract';
  return {
    diagnosis: diagnosisOf(plan),
    recurrent: plan.redo,
    indication: random.pick([
      'Symptomatic detachment, to be closed before the macula suffers further.',
      'Loss of field for some days; detachment confirmed with indirect ophthalmoscopy.',
      'Retina to be reattached; aims and risks were discussed.',
    ]),
    symptomsSince,
    macula: state,
    maculaOffDays: state === 'on' ? 'not-applicable' : random.whole(1, Math.max(1, Math.min(days, 21))),
    ...(detachment.from === undefined ? {} : { detachmentFromClock: detachment.from }),
    ...(detachment.to === undefined ? {} : { detachmentToClock: detachment.to }),
    totalDetachment: detachment.total,
    quadrantsDetached: detachment.quadrants,
    posteriorVitreousDetachment: plan.pvd,
    vitreousHaemorrhage: scenario.disease === 'break-only' || random.chance(scenario.vitrectomy ? 0.1 : 0.01),
    choroidalDetachment: false,
    pvr: pvr(plan),
    lens: plan.lens,
    axialLengthMm: plan.axialLengthMm,
    axialLengthMeasuredOn: measured,
    keratometryDioptres: plan.keratometryDioptres,
    sphericalEquivalentDioptres:
      plan.lens === 'aphakic'
        ? random.stepped(9, 12, 0.25)
        : phakic
          ? round((23.6 - plan.axialLengthMm) * 2.4 + random.stepped(-1, 1, 0.25), 0.25)
          : random.stepped(-2, 0.5, 0.25),
    acuity: random.pick(acuities[state]),
    pressureMmHg: random.whole(8, 18),
    previousOperations: earlier.length === 0 ? 'none' : earlier,
    fellowEye: random.pick([
      'Flat retina, no breaks.',
      'Posterior vitreous detachment, no break.',
      'Old laser round a hole, flat.',
    ]),
    anticoagulants: anticoagulants(plan),
  };
};
