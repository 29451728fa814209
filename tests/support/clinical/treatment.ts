import type { CaseRecord, RetinalBreak, RetinopexyTreatment } from '../../../src/domain/record/schema.ts';
import type { Plan } from './planned.ts';
import type { Random } from './random.ts';

type Treated = NonNullable<RetinalBreak['treatedBy']>;

const cryo = (
  random: Random,
  targets: NonNullable<RetinopexyTreatment['targets']>,
  breaks: number,
): RetinopexyTreatment => ({
  modality: 'cryo',
  targets,
  applications: breaks * random.whole(2, 7),
  endpointFirstWhitening: true,
});

const endolaser = (
  random: Random,
  targets: NonNullable<RetinopexyTreatment['targets']>,
  spots: readonly [number, number],
): RetinopexyTreatment => ({
  modality: 'endolaser',
  targets,
  applications: random.whole(spots[0], spots[1]),
  rows: random.whole(2, 4),
  powerMilliwatts: random.stepped(150, 350, 10),
  durationMilliseconds: random.pick([100, 150, 200]),
});

const indirect = (
  random: Random,
  targets: NonNullable<RetinopexyTreatment['targets']>,
): RetinopexyTreatment => ({
  modality: 'indirect-laser',
  targets,
  applications: random.whole(60, 300),
  rows: random.whole(2, 3),
  powerMilliwatts: random.stepped(200, 450, 10),
  durationMilliseconds: random.pick([100, 200]),
});

/** Retinopexy as recorded, and what each break was treated by. */
export const retinopexyOf = (
  plan: Plan,
  cutRetina: boolean,
): { stage: NonNullable<CaseRecord['retinopexy']>; treatedBy: Treated[] } => {
  const { random, scenario, breaks } = plan;
  const each = (kind: Treated[number]) => breaks.map((): Treated => [kind]);
  if (scenario.disease === 'macular-hole') {
    return { stage: { treatments: 'none' }, treatedBy: [['none']] };
  }
  if (scenario.disease === 'diabetic') {
    return {
      stage: {
        treatments: [
          endolaser(random, 'circumferential', [800, 1800]),
          ...(breaks.length === 0 ? [] : [endolaser(random, 'all-breaks', [20, 60])]),
        ],
      },
      treatedBy: each('laser'),
    };
  }
  if (!scenario.vitrectomy) {
    if (scenario.name === 'pneumatic retinopexy' && random.chance(0.3)) {
      return { stage: { treatments: [indirect(random, 'all-breaks')] }, treatedBy: each('laser') };
    }
    const flat = breaks.flatMap((found, at) => (found.detached ? [] : [at + 1]));
    const lifted = breaks.flatMap((found, at) => (found.detached ? [at + 1] : []));
    if (flat.length > 0 && lifted.length > 0 && random.chance(0.6)) {
      return {
        stage: { treatments: [cryo(random, lifted, lifted.length), indirect(random, flat)] },
        treatedBy: breaks.map((found): Treated => [found.detached ? 'cryo' : 'laser']),
      };
    }
    return { stage: { treatments: [cryo(random, 'all-breaks', breaks.length)] }, treatedBy: each('cryo') };
  }
  const wide = scenario.disease === 'pvr' ? random.chance(0.5) : random.chance(0.05);
  const ring = wide ? [endolaser(random, 'circumferential', [500, 1500])] : [];
  const long = scenario.disease === 'giant-tear';
  if (!long && !cutRetina && random.chance(0.2)) {
    return {
      stage: { treatments: [cryo(random, 'all-breaks', breaks.length), ...ring] },
      treatedBy: each('cryo'),
    };
  }
  if (breaks.length > 1 && random.chance(0.15)) {
    const rest = breaks.slice(1).map((_, at) => at + 2);
    return {
      stage: { treatments: [cryo(random, [1], 1), endolaser(random, rest, [80, 400]), ...ring] },
      treatedBy: breaks.map((_, at): Treated => [at === 0 ? 'cryo' : 'laser']),
    };
  }
  return {
    stage: { treatments: [endolaser(random, 'all-breaks', long ? [400, 1000] : [100, 600]), ...ring] },
    treatedBy: each('laser'),
  };
};
