import type { Family } from '../../../../src/domain/checks/define-rule.ts';
import type { Level } from '../../../../src/domain/checks/flag.ts';
import { type FieldPath, valueAt, withValue } from '../../../../src/domain/record/paths.ts';
import type {
  BuckleElement,
  CaseRecord,
  Eye,
  Posture,
  RetinalBreak,
  RetinopexyTreatment,
} from '../../../../src/domain/record/schema.ts';
import type { Random } from '../random.ts';

/** One thing that goes wrong on paper. Named for what went wrong, not for the rule that may find it. */
export interface Fault {
  id: string;
  family: Family;
  /** What a careful reader would call it. */
  level: Level;
  describe: string;
  /** The record with exactly this fault; `null` when this record cannot have it. */
  apply: (record: CaseRecord, random: Random) => CaseRecord | null;
}

type Values = Readonly<Record<FieldPath, unknown>>;
type When = (record: CaseRecord) => boolean;
type Heading = readonly [id: string, level: Level, describe: string];

type Item<T> = Exclude<NonNullable<T>, string> extends readonly (infer U)[] ? U : never;
interface Lists {
  'breaks.found': RetinalBreak;
  'buckle.elements': BuckleElement;
  'retinopexy.treatments': RetinopexyTreatment;
  'aftercare.posture': Posture;
  'aftercare.drops': Item<NonNullable<CaseRecord['aftercare']>['drops']>;
  'aftercare.tablets': Item<NonNullable<CaseRecord['aftercare']>['tablets']>;
  'endOfCase.medicines': Item<NonNullable<CaseRecord['endOfCase']>['medicines']>;
  'before.previousOperations': Item<NonNullable<CaseRecord['before']>['previousOperations']>;
  'before.anticoagulants': Item<NonNullable<CaseRecord['before']>['anticoagulants']>;
  'vitreous.retinotomies': Item<NonNullable<CaseRecord['vitreous']>['retinotomies']>;
  'who.assistants': Item<NonNullable<CaseRecord['who']>['assistants']>;
  'anaesthesia.agents': Item<NonNullable<CaseRecord['anaesthesia']>['agents']>;
}

export const put = (record: CaseRecord, values: Values): CaseRecord =>
  Object.entries(values).reduce((so, [path, value]) => withValue(so, path, value), record);

export const listAt = <P extends keyof Lists>(record: CaseRecord, path: P): Lists[P][] => {
  const list = valueAt(record, path);
  return Array.isArray(list) ? (list as Lists[P][]) : [];
};

export const otherEye = (eye: Eye | undefined): Eye => (eye === 'right' ? 'left' : 'right');

/** The faults of one family, written as a table. */
export const inFamily = (family: Family) => ({
  /** The values that make the fault, or `null`. */
  wrong: (
    [id, level, describe]: Heading,
    values: (record: CaseRecord, random: Random) => Values | null,
  ): Fault => ({
    id,
    family,
    level,
    describe,
    apply: (record, random) => {
      const found = values(record, random);
      return found === null ? null : put(record, found);
    },
  }),
  /** A field that the rest makes necessary is left empty. */
  missing: ([id, level, describe]: Heading, path: FieldPath, when: When = () => true): Fault => ({
    id,
    family,
    level,
    describe,
    apply: (record) =>
      valueAt(record, path) === undefined || !when(record) ? null : withValue(record, path, undefined),
  }),
  /** One item of a list is changed; the item is drawn from those in which the fault is possible. */
  inItem: <P extends keyof Lists>(
    [id, level, describe]: Heading,
    list: P,
    values: (item: Lists[P], record: CaseRecord, random: Random, index: number) => Values | null,
  ): Fault => ({
    id,
    family,
    level,
    describe,
    apply: (record, random) => {
      const options = listAt(record, list).flatMap((item, index) => {
        const found = values(item, record, random, index);
        return found === null ? [] : [{ index, found }];
      });
      if (options.length === 0) return null;
      const { index, found } = random.pick(options);
      return put(
        record,
        Object.fromEntries(Object.entries(found).map(([key, value]) => [`${list}.${index}.${key}`, value])),
      );
    },
  }),
});

export const encircles = (record: CaseRecord): boolean =>
  listAt(record, 'buckle.elements').some((element) => element.role === 'encircling');
export const buckled = (record: CaseRecord): boolean => listAt(record, 'buckle.elements').length > 0;
export const vitrectomized = (record: CaseRecord): boolean => record.vitreous?.vitrectomy === true;
export const hasGas = (record: CaseRecord): boolean =>
  ['air', 'SF6', 'C2F6', 'C3F8'].includes(record.tamponade?.agent ?? '');
export const hasLongGas = (record: CaseRecord): boolean =>
  hasGas(record) && record.tamponade?.agent !== 'air';
export const diluted = (record: CaseRecord): boolean => record.tamponade?.mixing === 'diluted';
export const hasOil = (record: CaseRecord): boolean =>
  ['silicone-oil', 'heavy-oil'].includes(record.tamponade?.agent ?? '');
export const general = (record: CaseRecord): boolean => record.anaesthesia?.kind === 'general';
