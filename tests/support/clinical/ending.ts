import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { addMinutes } from './calendar.ts';
import type { Plan } from './planned.ts';
import { allergicTo, type Clock } from './team.ts';

type End = NonNullable<CaseRecord['endOfCase']>;
type Medicines = Exclude<NonNullable<End['medicines']>, 'none'>;

export interface Written {
  who: NonNullable<CaseRecord['who']>;
  before: NonNullable<CaseRecord['before']>;
  vitreous: NonNullable<CaseRecord['vitreous']>;
  drainage: NonNullable<CaseRecord['drainage']>;
  tamponade: NonNullable<CaseRecord['tamponade']>;
}

const medicines = (plan: Plan, written: Written, clock: Clock): Medicines => {
  const { random, eye } = plan;
  const givenAt = addMinutes(clock.endedAt, -random.whole(1, 5));
  if (plan.scenario.name === 'pneumatic retinopexy') {
    const drug = allergicTo(written.who, 'chloramphenicol') ? 'ofloxacin' : 'chloramphenicol';
    return [{ drug, dose: '1 drop', route: 'topical', eye, givenAt }];
  }
  const antibiotic =
    allergicTo(written.who, 'penicillin') || random.chance(0.3)
      ? ['gentamicin', '20 mg']
      : ['cefuroxime', '125 mg'];
  const list: Medicines = [
    {
      drug: antibiotic[0] ?? 'gentamicin',
      dose: antibiotic[1] ?? '20 mg',
      route: 'subconjunctival',
      eye,
      givenAt,
    },
    {
      drug: random.pick(['dexamethasone', 'betamethasone']),
      dose: '4 mg',
      route: 'subconjunctival',
      eye,
      givenAt,
    },
  ];
  if (!allergicTo(written.who, 'sulfonamides') && random.chance(0.15)) {
    list.push({ drug: 'acetazolamide', dose: '500 mg', route: 'intravenous', givenAt });
  }
  return list;
};

const retina = (plan: Plan, written: Written): Pick<End, 'retina' | 'fluidLeftWhere' | 'breaksClosed'> => {
  const { scenario, detachment, random } = plan;
  const closed = plan.breaks.length === 0 ? {} : ({ breaksClosed: 'all' } as const);
  if (scenario.disease === 'break-only') return { retina: 'flat', breaksClosed: 'all' };
  const dry = written.drainage.outcome === 'complete';
  if (dry || (scenario.disease === 'diabetic' && plan.breaks.length === 0))
    return { retina: 'flat', ...closed };
  const pneumatic = scenario.name === 'pneumatic retinopexy';
  return {
    retina: pneumatic && random.chance(0.4) ? 'detached' : 'fluid-left',
    fluidLeftWhere:
      detachment.total || detachment.quadrants > 2
        ? 'shallow fluid below and at the posterior pole'
        : 'shallow fluid in the area that was off',
    ...(pneumatic ? { breaksClosed: 'none' as const } : closed),
  };
};

export const endStage = (plan: Plan, written: Written, clock: Clock): End => {
  const { random, scenario } = plan;
  const peeled = written.vitreous.membranesPeeled?.some((kind) => kind !== 'none') ?? false;
  const tissue: NonNullable<End['tissue']> = [
    ...(scenario.vitrectomy ? (['vitreous'] as const) : []),
    ...(peeled ? (['membrane'] as const) : []),
    ...(written.vitreous.lensWork === 'phacoemulsification' ? (['lens'] as const) : []),
  ];
  return {
    postoperativeDiagnosis: written.before.diagnosis,
    ...retina(plan, written),
    pressureMmHg: random.whole(12, 22),
    pressureBy: random.pick(['tonometer', 'palpation']),
    discPerfused: true,
    complications: 'none',
    bloodLoss: random.pick(['none', 'minimal', 'minimal']),
    specimens: 'none',
    counts: 'correct',
    medicines: medicines(plan, written, clock),
    thrombosisProphylaxis: plan.general && random.chance(0.4) ? 'mechanical' : 'not-indicated',
    shield: true,
    ...(plan.bandFromBefore
      ? { extraSteps: 'The band from the earlier operation was found in place and left; it was not touched.' }
      : {}),
    ...(plan.heavyLiquidStays
      ? {
          extraSteps:
            'Heavy liquid left as a short-term tamponade; to be taken out at the planned second operation.',
        }
      : {}),
    tissue: tissue.length === 0 ? ['none'] : tissue,
  };
};
