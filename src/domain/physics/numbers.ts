import { equatorMm } from '../anatomy/globe.ts';
import type { CaseRecord } from '../record/schema.ts';
import type { Figure } from './figure.ts';
import { bandFigures } from './figures/band.ts';
import { bubbleFigures } from './figures/bubble.ts';
import { gasFigures } from './figures/gas.ts';
import { type Ground, groundOf, round } from './figures/ground.ts';
import { supportFigures } from './figures/support.ts';

export type { Figure } from './figure.ts';

const globeFigures = ({ globe, axialLengthMm, assumed, record }: Ground): Figure[] =>
  record.before?.axialLengthMm === undefined
    ? []
    : [
        {
          id: 'equator-arc',
          name: 'Equator behind the limbus',
          value: round(equatorMm(globe)),
          unit: 'mm',
          formula: 'R·(π/2 − θ0)',
          inputs: { axialLengthMm },
          assumed,
          source: 'Sphere; limbus radius 5.9 mm (computed)',
          fields: ['before.axialLengthMm'],
          sentence: `The equator lies about ${round(equatorMm(globe))} mm behind the limbus (an estimate).`,
        },
      ];

/** Every figure that follows from what a record holds so far, in the order of the operation. */
export const numbersOf = (record: CaseRecord): Figure[] => {
  const ground = groundOf(record);
  return [
    ...globeFigures(ground),
    ...supportFigures(ground),
    ...bandFigures(ground),
    ...gasFigures(ground),
    ...bubbleFigures(ground),
  ];
};
