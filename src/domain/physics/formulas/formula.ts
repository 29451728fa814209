import { defaults } from '../../anatomy/globe.ts';
import { type Gas, gases, gasFacts, type LensState } from '../gas.ts';

export interface NumberInput {
  name: string;
  unit: string;
  min: number;
  max: number;
  /** Taken when it is not given; without one the input is needed. */
  usual?: number;
}

export interface ChoiceInput {
  name: string;
  choices: readonly string[];
  usual?: string;
}

export type Answered = { value: number | string } | { low: number; high: number };

export type Given = Readonly<Record<string, number | string>>;

export interface Formula {
  title: string;
  formula: string;
  unit: string;
  source: string;
  inputs: readonly (NumberInput | ChoiceInput)[];
  compute: (given: { n: (name: string) => number; s: (name: string) => string }) => Answered | undefined;
}

export const mm = (name: string, max = 60, usual?: number): NumberInput => ({
  name,
  unit: 'mm',
  min: 0,
  max,
  ...(usual === undefined ? {} : { usual }),
});
export const number = (
  name: string,
  unit: string,
  min: number,
  max: number,
  usual?: number,
): NumberInput => ({
  name,
  unit,
  min,
  max,
  ...(usual === undefined ? {} : { usual }),
});
export const choice = (name: string, choices: readonly string[], usual?: string): ChoiceInput => ({
  name,
  choices,
  ...(usual === undefined ? {} : { usual }),
});

export const axial = number('axialLengthMm', 'mm', 14, 40, defaults.axialLengthMm);
export const clock = (name: string, usual?: number) => number(name, 'o’clock', 1, 12.999, usual);
export const eye = choice('eye', ['right', 'left'], 'right');
export const gas = choice('gas', gases);
export const lens = choice('lens', ['phakic', 'aphakic'], 'phakic');
export const percent = number('percent', '%', 0, 100);
export const usualPercent = (of: Gas) => gasFacts[of].isoexpansile.usual;

export const TILLAUX = 'Spiral of Tillaux, IOVS 2022;63:1877 (read)';
export const SPHERE = 'Sphere (computed)';
export const CAP = 'Cap of a sphere (computed)';
export const THOMPSON = 'Thompson, Arch Ophthalmol 1989;107:687 and 1992;110:1594 (read)';
export const ALERT = 'Royal College of Ophthalmologists safety alert, 18 December 2018 (read)';

export const asGas = (name: string): Gas => gases.find((one) => one === name) ?? 'air';
export const asLens = (name: string): LensState => (name === 'aphakic' ? 'aphakic' : 'phakic');
export const asEye = (name: string) => (name === 'left' ? 'left' : 'right');
