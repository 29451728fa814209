import { defaults, type Globe, globeOf } from '../../anatomy/globe.ts';
import type { CaseRecord, Eye } from '../../record/schema.ts';

/** To so many places. */
export const round = (value: number, places = 1): number => Math.round(value * 10 ** places) / 10 ** places;

/** What every figure of a record stands on, and what stood in for facts that are missing. */
export interface Ground {
  record: CaseRecord;
  globe: Globe;
  eye: Eye;
  axialLengthMm: number;
  assumed: string[];
}

export const groundOf = (record: CaseRecord): Ground => {
  const measured = record.before?.axialLengthMm;
  const axialLengthMm = measured ?? defaults.axialLengthMm;
  const eye = record.who?.eye;
  return {
    record,
    globe: globeOf(axialLengthMm),
    eye: eye ?? 'right',
    axialLengthMm,
    assumed: [
      ...(measured === undefined ? [`an axial length of ${defaults.axialLengthMm} mm`] : []),
      ...(eye === undefined ? ['a right eye'] : []),
    ],
  };
};

export const IOVS_SPIRAL = 'Spiral of Tillaux, IOVS 2022;63:1877 (read)';
