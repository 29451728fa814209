import { withValue } from '../../../src/domain/record/paths.ts';
import { type CaseRecord, RECORD_VERSION } from '../../../src/domain/record/schema.ts';
import { breaksStage } from './breaks.ts';
import { buckleStage, plannedElements } from './buckling.ts';
import { addDays } from './calendar.ts';
import { endStage } from './ending.ts';
import { beforeStage, symptomDays } from './history.ts';
import { aftercareStage } from './leaving.ts';
import { withOddities } from './oddities.ts';
import { planFrom } from './plan.ts';
import type { Plan } from './planned.ts';
import { performedIn } from './procedures.ts';
import type { Random } from './random.ts';
import { tamponadeStage } from './tamponade.ts';
import { anaesthesiaStage, timesOf, whoStage } from './team.ts';
import { retinopexyOf } from './treatment.ts';
import { drainageStage, vitreousStage } from './vitrectomy.ts';

/*
 * Complete, sound operative records of every kind of operation for detached retina. Written from how these operations
 * are done and from published figures, without sight of the checker's rules, so that what the checker says of them can
 * be counted as true or false alarm. Unusual but sound things and how often they are tried stand in `oddities.ts`.
 */

const assemble = (plan: Plan): CaseRecord => {
  const symptomsSince = addDays(plan.on, -symptomDays(plan));
  const clock = timesOf(plan);
  const who = whoStage(plan, clock, symptomsSince);
  const before = beforeStage(plan, symptomsSince);
  const anaesthesia = anaesthesiaStage(plan, who, before.anticoagulants !== 'none');
  const elements = plannedElements(plan);
  const vitreous = vitreousStage(plan);
  const drainage = drainageStage(plan, vitreous);
  const retinopexy = retinopexyOf(plan, Array.isArray(vitreous.retinotomies));
  const tamponade = tamponadeStage(plan, vitreous.heavyLiquid !== 'none', drainage.kind === 'external');
  const written = { who, before, vitreous, drainage, tamponade };
  const record: CaseRecord = {
    version: RECORD_VERSION,
    who,
    before,
    anaesthesia,
    breaks: breaksStage(plan, elements, retinopexy.treatedBy),
    buckle: buckleStage(plan, elements),
    vitreous,
    drainage,
    retinopexy: retinopexy.stage,
    tamponade,
    endOfCase: endStage(plan, written, clock),
    aftercare: aftercareStage(plan, written, clock),
  };
  const performed = performedIn(record);
  return withValue(withValue(record, 'who.performed', performed), 'who.planned', performed);
};

/** A complete, sound record; the same number gives the same record on every machine. */
export const cleanRecord = (start: number): CaseRecord => {
  const plan = planFrom(start);
  return withOddities(assemble(plan), plan);
};

/** The kind of operation that a number stands for. */
export const scenarioOf = (start: number): string => planFrom(start).scenario.name;

const leaves = (value: unknown, path: string): string[] => {
  if (typeof value !== 'object' || value === null) return [path];
  const inside = Object.entries(value).flatMap(([key, item]) =>
    leaves(item, path === '' ? key : `${path}.${key}`),
  );
  // A list of plain values is one field.
  return Array.isArray(value) && value.every((item) => typeof item !== 'object') ? [path] : inside;
};

/** Every recorded field of a record. */
export const fieldsOf = (record: CaseRecord): string[] =>
  leaves(record, '').filter((path) => path !== 'version');

/** The same record while it is still being filled in: fields, and sometimes whole stages, are absent. */
export const incomplete = (record: CaseRecord, random: Random): CaseRecord => {
  const share = random.pick([0.05, 0.15, 0.3, 0.5, 0.8]);
  const stages = Object.keys(record).filter((key) => key !== 'version' && random.chance(share / 3));
  const fields = fieldsOf(record).filter(() => random.chance(share));
  return [...fields, ...stages].reduce((so, path) => withValue(so, path, undefined), record);
};
