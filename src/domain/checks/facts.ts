import type { ClockArc } from '../anatomy/clock.ts';
import { dateWords, labelOf, listWords, numberWords, timesWords, withArticle } from '../drafting/words.ts';
import { isGas } from '../physics/gas.ts';
import type {
  BuckleElement,
  CaseRecord,
  Fixation,
  Posture,
  RetinalBreak,
  RetinopexyTreatment,
} from '../record/schema.ts';

/* How rules ask a record. A list that is absent or recorded as none is empty here; rules that must tell them apart look at the field. */

const listed = <T>(list: readonly T[] | string | undefined): readonly T[] =>
  Array.isArray(list) ? list : [];

export const elementsOf = (record: CaseRecord): readonly BuckleElement[] => listed(record.buckle?.elements);
export const breaksOf = (record: CaseRecord): readonly RetinalBreak[] => listed(record.breaks?.found);
export const treatmentsOf = (record: CaseRecord): readonly RetinopexyTreatment[] =>
  listed(record.retinopexy?.treatments);
export const posturesOf = (record: CaseRecord): readonly Posture[] => listed(record.aftercare?.posture);
export const fixationsOf = (element: BuckleElement): readonly Fixation[] => listed(element.fixation);
export const complicationsOf = (record: CaseRecord) => listed(record.endOfCase?.complications);
export const medicinesOf = (record: CaseRecord) => listed(record.endOfCase?.medicines);
export const dropsOf = (record: CaseRecord) => listed(record.aftercare?.drops);
export const tabletsOf = (record: CaseRecord) => listed(record.aftercare?.tablets);
export const allergiesOf = (record: CaseRecord) => listed(record.who?.patient?.allergies);
export const retinotomiesOf = (record: CaseRecord) => listed(record.vitreous?.retinotomies);
export const previousOf = (record: CaseRecord) => listed(record.before?.previousOperations);
export const closureOf = (element: BuckleElement) =>
  typeof element.closure === 'object' ? element.closure : undefined;
export const lensImplantOf = (record: CaseRecord) =>
  typeof record.vitreous?.lensImplant === 'object' ? record.vitreous.lensImplant : undefined;

export const isEncircling = (element: BuckleElement): boolean => element.role === 'encircling';

/** Number in a field that may also say "not applicable". */
export const numberIn = (value: number | string | undefined): number | undefined =>
  typeof value === 'number' ? value : undefined;

export const gasOf = (record: CaseRecord) => {
  const agent = record.tamponade?.agent;
  return isGas(agent) ? agent : undefined;
};

/** A gas that outlasts the first days: not air. */
export const longGasOf = (record: CaseRecord) => {
  const gas = gasOf(record);
  return gas === 'air' ? undefined : gas;
};

export const oilOf = (record: CaseRecord) => {
  const agent = record.tamponade?.agent;
  return agent === 'silicone-oil' || agent === 'heavy-oil' ? agent : undefined;
};

/** The day of the operation, YYYY-MM-DD. */
export const operatedOn = (record: CaseRecord): string | undefined => record.who?.startedAt?.slice(0, 10);

/** Whole days from one day to another. */
export const daysBetween = (from: string, to: string): number =>
  Math.round((Date.parse(to.slice(0, 10)) - Date.parse(from.slice(0, 10))) / 86_400_000);

/** Minutes from one local time to another. */
export const minutesBetween = (from: string, to: string): number =>
  Math.round((Date.parse(`${to}:00Z`) - Date.parse(`${from}:00Z`)) / 60_000);

/** Age in years on the day of the operation. */
export const ageOf = (record: CaseRecord): number | undefined => {
  const born = record.who?.patient?.dateOfBirth;
  const on = operatedOn(record);
  if (born === undefined || on === undefined) return undefined;
  const years = Number(on.slice(0, 4)) - Number(born.slice(0, 4));
  return on.slice(5) < born.slice(5) ? years - 1 : years;
};

/** How an element is called in a message. */
export const elementName = (element: BuckleElement, index: number): string =>
  element.role === 'encircling' ? 'The band' : `Element ${index + 1}`;

export { dateWords, labelOf, listWords, numberWords, timesWords, withArticle };

/** Where the retina is detached: an arc, the whole round, or `undefined` while it is not recorded. */
export const detachedArcOf = (record: CaseRecord): ClockArc | 'all' | undefined => {
  const { totalDetachment, detachmentFromClock: from, detachmentToClock: to } = record.before ?? {};
  if (from !== undefined && to !== undefined) return { from, to };
  return totalDetachment === true ? 'all' : undefined;
};

/** Those of several facts that are absent; `field` is where each belongs, `what` how it is called. */
export const missingFrom = <T extends { value: unknown }>(items: readonly T[]): T[] =>
  items.filter(({ value }) => value === undefined);

/** The same words with a capital at the start. */
export const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/**
 * How far a break may reach to each side of its clock hour, hours. Where its extent is not recorded, as far as its kind may reach; tears
 * and holes of three hours are giant tears.
 */
export const reachOf = ({ kind, extentClockHours }: RetinalBreak): number =>
  kind === 'giant-tear' || kind === 'dialysis' || kind === undefined
    ? (extentClockHours ?? 12) / 2
    : Math.min(extentClockHours ?? 3, 3) / 2;
