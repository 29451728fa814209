import type { Eye, RetinalBreak, TamponadeAgent } from '../../../src/domain/record/schema.ts';
import type { Detachment } from './detachment.ts';
import { equatorMm } from './globe.ts';
import type { Random } from './random.ts';
import type { Lens, Scenario } from './scenario.ts';

export interface PlannedBreak {
  kind: NonNullable<RetinalBreak['kind']>;
  /** Absent for a macular hole. */
  clock?: number;
  extent: number;
  front?: number;
  back?: number;
  detached: boolean;
}

/** An encircling band as planned: where its front edge runs and how wide it is. */
export interface Band {
  form: 'band' | 'strip';
  widthMm: number;
  thicknessMm: number;
  reference: 'insertions' | 'limbus';
  frontEdgeMm: number;
}

/** What is settled about a case before its stages are written down. */
export interface Plan {
  random: Random;
  scenario: Scenario;
  eye: Eye;
  age: number;
  /** Day of the operation. */
  on: string;
  lens: Lens;
  axialLengthMm: number;
  keratometryDioptres: number;
  redo: boolean;
  /** A band from an earlier operation is still on the eye. */
  bandFromBefore: boolean;
  pvd: 'complete' | 'partial' | 'none' | 'unknown';
  detachment: Detachment;
  breaks: PlannedBreak[];
  band: Band | undefined;
  agent: TamponadeAgent;
  /** Heavy liquid stays for some days on purpose, in place of a tamponade. */
  heavyLiquidStays: boolean;
  general: boolean;
}

/** Words for where a break lies between ora and equator, from its edges. */
export const zoneOf = (found: PlannedBreak, axialLengthMm: number): NonNullable<RetinalBreak['zone']> => {
  if (found.kind === 'macular-hole') return 'posterior-pole';
  if (found.kind === 'dialysis') return 'ora';
  const middle = ((found.front ?? 0) + (found.back ?? 0)) / 2;
  const beyond = middle - equatorMm(axialLengthMm);
  if (beyond > 1.5) return 'post-equatorial';
  return beyond > -0.75 ? 'equator' : 'pre-equatorial';
};
