import type { CaseRecord, TamponadeAgent } from '../../../src/domain/record/schema.ts';

export type Lens = NonNullable<NonNullable<CaseRecord['before']>['lens']>;

export type BuckleKind = 'none' | 'band' | 'segment' | 'radial' | 'band-and-segment' | 'band-and-under-band';

export type Disease =
  | 'tears'
  | 'round-holes'
  | 'dialysis'
  | 'giant-tear'
  | 'pvr'
  | 'macular-hole'
  | 'diabetic'
  | 'break-only';

export type Weighted<T> = readonly (readonly [number, T])[];

/** One kind of operation, with the patients in whom it is usually done. */
export interface Scenario {
  name: string;
  buckle: BuckleKind;
  temporary?: boolean;
  vitrectomy: boolean;
  disease: Disease;
  agents: Weighted<TamponadeAgent>;
  ages: readonly [number, number];
  lenses: Weighted<Lens>;
  minutes: readonly [number, number];
}

export const clear: Weighted<Lens> = [[1, 'phakic']];
export const mostlyClear: Weighted<Lens> = [
  [8, 'phakic'],
  [1, 'cataract'],
  [2, 'pseudophakic'],
];
export const older: Weighted<Lens> = [
  [4, 'phakic'],
  [3, 'cataract'],
  [6, 'pseudophakic'],
  [0.4, 'aphakic'],
];
export const fewGases: Weighted<TamponadeAgent> = [
  [8, 'none'],
  [2, 'air'],
  [1, 'SF6'],
];
export const gases: Weighted<TamponadeAgent> = [
  [2, 'air'],
  [9, 'SF6'],
  [3, 'C2F6'],
  [4, 'C3F8'],
];
export const oils: Weighted<TamponadeAgent> = [
  [5, 'silicone-oil'],
  [3, 'heavy-oil'],
  [2, 'C3F8'],
];
