import type { CaseRecord } from '../../record/schema.ts';

/** Something that is said to have happened, or to be so. */
export interface Claim {
  words: RegExp;
  /** What is recorded: happened, did not happen, or nobody said. */
  happened: (record: CaseRecord) => boolean | undefined;
  field: string;
  recorded: (record: CaseRecord) => string;
  /** The clause must not speak of this. */
  unless?: RegExp;
  /** The words themselves say that it did not happen: "non-drainage", "sutureless". */
  negative?: true;
}

/** A claim whose record reads "drainage" or "no drainage". */
export const claim = (
  words: RegExp,
  field: string,
  name: string,
  happened: Claim['happened'],
  more: Pick<Claim, 'unless' | 'negative'> = {},
): Claim => ({
  words,
  field,
  happened,
  recorded: (record) => (happened(record) === true ? name : `no ${name}`),
  ...more,
});

export const some = (list: readonly unknown[] | 'none' | undefined): boolean | undefined =>
  list === undefined ? undefined : list !== 'none' && list.length > 0;

export const among = <T extends string>(
  list: readonly T[] | undefined,
  value: NoInfer<T>,
): boolean | undefined => list?.includes(value);

export const hasRole = (record: CaseRecord, role: string): boolean | undefined => {
  const elements = record.buckle?.elements;
  if (elements === undefined || elements === 'none') return elements === undefined ? undefined : false;
  if (elements.some((element) => element.role === role)) return true;
  return elements.some((element) => element.role === undefined) ? undefined : false;
};

export const hasModality = (record: CaseRecord, modalities: readonly string[]): boolean | undefined => {
  const treatments = record.retinopexy?.treatments;
  if (treatments === undefined || treatments === 'none') return treatments === undefined ? undefined : false;
  if (treatments.some(({ modality }) => modality !== undefined && modalities.includes(modality))) return true;
  return treatments.some(({ modality }) => modality === undefined) ? undefined : false;
};

export const lasers = ['endolaser', 'indirect-laser', 'slit-lamp-laser', 'trans-scleral-laser'];

export const drainageKind = (kinds: readonly string[]) => (record: CaseRecord) => {
  const kind = record.drainage?.kind;
  return kind === undefined ? undefined : kinds.includes(kind);
};

export const hasComplication = (kind: string) => (record: CaseRecord) => {
  const list = record.endOfCase?.complications;
  if (list === undefined) return undefined;
  return list !== 'none' && list.some((one) => one.kind === kind);
};

export const retinotomy = (kinds: readonly string[]) => (record: CaseRecord) => {
  const list = record.vitreous?.retinotomies;
  if (list === undefined) return undefined;
  return list !== 'none' && list.some(({ kind }) => kind !== undefined && kinds.includes(kind));
};
