import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { addDays, addMinutes } from './calendar.ts';
import { familyName, givenName, staff } from './people.ts';
import type { Plan } from './planned.ts';
import type { Random } from './random.ts';

type Who = NonNullable<CaseRecord['who']>;
type Allergies = NonNullable<Who['patient']>['allergies'];

export interface Clock {
  timeOutAt: string;
  startedAt: string;
  endedAt: string;
}

export const timesOf = (plan: Plan): Clock => {
  const { random, scenario } = plan;
  const minutes = random.whole(scenario.minutes[0], scenario.minutes[1]);
  const hour = random.weighted([
    [12, random.whole(8, 16)],
    [2, random.whole(17, 20)],
  ]);
  const startedAt = `${plan.on}T${String(hour).padStart(2, '0')}:${String(random.whole(0, 59)).padStart(2, '0')}`;
  return {
    startedAt,
    timeOutAt: addMinutes(startedAt, -random.whole(1, 9)),
    endedAt: addMinutes(startedAt, minutes),
  };
};

const allergies = (random: Random): Allergies =>
  random.weighted<Allergies>([
    [80, 'none'],
    [7, [{ substance: 'penicillin', reaction: 'rash' }]],
    [3, [{ substance: 'sulfonamides', reaction: 'rash' }]],
    [3, [{ substance: 'latex', reaction: 'contact urticaria' }]],
    [2, [{ substance: 'iodine', reaction: 'skin blistering' }]],
    [2, [{ substance: 'chloramphenicol', reaction: 'lid swelling' }]],
    [2, [{ substance: 'ibuprofen', reaction: 'wheeze' }]],
    [
      1,
      [
        { substance: 'codeine', reaction: 'vomiting' },
        { substance: 'penicillin', reaction: 'anaphylaxis' },
      ],
    ],
  ]);

/** Whether the patient is said to be allergic to any of these. */
export const allergicTo = (who: Who, ...substances: string[]): boolean =>
  Array.isArray(who.patient?.allergies) &&
  who.patient.allergies.some((entry) => substances.some((name) => entry.substance?.includes(name) ?? false));

const seniority = (
  plan: Plan,
  names: readonly string[],
): Pick<Who, 'surgeon' | 'supervisor' | 'assistants'> => {
  const { random } = plan;
  const [operator = 'Dr A', senior = 'Dr B', helper = 'Dr C'] = names;
  const assistants: Who['assistants'] = random.chance(0.75)
    ? [
        {
          name: helper,
          role: random.pick(['specialty registrar', 'fellow', 'foundation doctor']),
          did: random.pick([
            'indented and cut sutures',
            'held the muscle slings',
            'indented for the search and laser',
          ]),
        },
      ]
    : 'none';
  if (random.chance(0.1)) {
    return {
      surgeon: { name: operator, role: 'trainee' },
      supervisor: { name: senior, scrubbed: true },
      assistants,
    };
  }
  if (random.chance(0.12)) {
    return {
      surgeon: { name: operator, role: 'fellow' },
      supervisor: { name: senior, scrubbed: random.chance(0.5) },
      assistants,
    };
  }
  return { surgeon: { name: operator, role: 'consultant' }, supervisor: 'none', assistants };
};

const needsName = (kind: NonNullable<NonNullable<Who['referrer']>['kind']>) => kind !== 'self';

/** Who and which eye; the procedures are added when the rest is known. */
export const whoStage = (plan: Plan, clock: Clock, symptomsSince: string): Who => {
  const { random, eye, on } = plan;
  const names = staff(random, 7);
  const kind = random.weighted<NonNullable<NonNullable<Who['referrer']>['kind']>>([
    [6, 'optometrist'],
    [3, 'ophthalmologist'],
    [2, 'emergency-department'],
    [1, 'family-doctor'],
    [0.5, 'self'],
  ]);
  const afterSymptoms = Math.round((Date.parse(on) - Date.parse(symptomsSince)) / 86_400_000);
  return {
    patient: {
      familyName: familyName(random),
      givenName: givenName(random),
      dateOfBirth: addDays(on, -Math.round(plan.age * 365.25 + random.whole(10, 350))),
      number: `P${random.whole(100000, 999999)}`,
      allergies: allergies(random),
    },
    eye,
    consentEye: eye,
    markedEye: eye,
    timeOutEye: eye,
    ...clock,
    urgency: random.weighted([
      [7, 'urgent'],
      [2, 'emergency'],
      [plan.redo || plan.scenario.disease === 'diabetic' ? 4 : 1, 'elective'],
    ]),
    theatre: `Theatre ${random.whole(1, 6)}`,
    ...seniority(plan, names),
    anaesthetist: plan.general || random.chance(0.6) ? (names[3] ?? 'none') : 'none',
    scrubNurse: (names[4] ?? 'Dr D').replace(/^\S+/, 'Nurse'),
    referrer: {
      kind,
      ...(needsName(kind)
        ? { name: names[5] ?? 'Dr E', referredOn: addDays(on, -random.whole(0, Math.min(afterSymptoms, 3))) }
        : {}),
    },
    familyDoctor: names[6] ?? 'Dr F',
  };
};

export const anaesthesiaStage = (
  plan: Plan,
  who: Who,
  thinned: boolean,
): NonNullable<CaseRecord['anaesthesia']> => {
  const { random, eye } = plan;
  const antisepsis = allergicTo(who, 'iodine') ? 'chlorhexidine' : 'povidone-iodine';
  const stopped = { nitrousOxideUsed: false, nitrousOxideStoppedAt: 'not-applicable', antisepsis } as const;
  const lidocaine = { drug: 'lidocaine', concentrationPercent: 2 };
  const long = random.pick([
    { drug: 'bupivacaine', concentrationPercent: 0.5 },
    { drug: 'levobupivacaine', concentrationPercent: 0.75 },
    { drug: 'ropivacaine', concentrationPercent: 0.75 },
  ]);
  const block = [
    { ...lidocaine, volumeMl: random.pick([2, 2.5, 3]) },
    { ...long, volumeMl: random.pick([2, 2.5, 3]) },
  ];
  if (plan.general) {
    const withBlock = random.chance(0.25);
    return {
      kind: 'general',
      sedation: false,
      blockEye: withBlock ? eye : 'not-applicable',
      agents: withBlock ? [{ ...long, volumeMl: 3 }] : 'none',
      ...stopped,
    };
  }
  const sedation = who.anaesthetist !== 'none' && random.chance(0.35);
  if (plan.scenario.name === 'pneumatic retinopexy' && random.chance(0.6)) {
    return {
      kind: 'topical',
      sedation: false,
      blockEye: 'not-applicable',
      agents: [{ drug: 'proxymetacaine', concentrationPercent: 0.5 }],
      ...stopped,
    };
  }
  // A sharp needle is avoided round a long eye and in thinned blood.
  const sharp = plan.axialLengthMm <= 26 && !thinned;
  const kind = random.weighted<'sub-tenon' | 'peribulbar' | 'retrobulbar'>([
    [7, 'sub-tenon'],
    [sharp ? 3 : 0, 'peribulbar'],
    [sharp ? 0.5 : 0, 'retrobulbar'],
  ]);
  return { kind, sedation, blockEye: eye, agents: block, ...stopped };
};
