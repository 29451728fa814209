import type { CaseRecord } from '../../../../src/domain/record/schema.ts';
import { addDays } from '../calendar.ts';
import { insertionMm } from '../globe.ts';
import { encircles, inFamily, listAt } from './fault.ts';

const refraction = inFamily('refraction');
const hasLens = (r: CaseRecord) => typeof r.vitreous?.lensImplant === 'object';

export const refractionFaults = [
  refraction.wrong(
    ['length-with-figures-changed-over', 'caution', 'Axial length with figures changed over'],
    (r) =>
      (r.before?.axialLengthMm ?? 0) >= 23.9 && (r.before?.axialLengthMm ?? 0) < 25
        ? { 'before.axialLengthMm': 42 }
        : null,
  ),
  refraction.wrong(['length-of-a-mouse', 'caution', 'Axial length 12 mm'], () => ({
    'before.axialLengthMm': 12,
  })),
  refraction.wrong(
    ['lens-with-another-length', 'contradiction', 'The lens was calculated with another axial length'],
    (r) =>
      hasLens(r) ? { 'vitreous.lensImplant.axialLengthUsedMm': (r.before?.axialLengthMm ?? 24) - 2.1 } : null,
  ),
  refraction.wrong(
    ['lens-power-without-its-point', 'contradiction', 'Lens power without its decimal point'],
    (r) =>
      hasLens(r) && Math.abs(r.before?.axialLengthMm ?? 0) < 25
        ? { 'vitreous.lensImplant.powerDioptres': 2 }
        : null,
  ),
  refraction.wrong(
    [
      'eye-measured-before-the-earlier-band',
      'caution',
      'The length was measured before an earlier encircling band',
    ],
    (r) => {
      const band = listAt(r, 'before.previousOperations').find(
        (o) => o.what === 'encircling-band' && o.eye === r.who?.eye,
      );
      return band?.on === undefined ? null : { 'before.axialLengthMeasuredOn': addDays(band.on, -60) };
    },
  ),
  refraction.wrong(['cornea-of-sixty-five', 'caution', 'Keratometry 65 D'], () => ({
    'before.keratometryDioptres': 65,
  })),
  refraction.wrong(['far-sighted-long-eye', 'caution', 'Plus ten in a phakic eye of 28 mm'], (r) =>
    r.before?.lens === 'phakic' && (r.before.axialLengthMm ?? 0) > 27.5
      ? { 'before.sphericalEquivalentDioptres': 10 }
      : null,
  ),
  refraction.wrong(['sign-of-the-refraction', 'caution', 'Minus ten in a phakic eye of 21 mm'], (r) =>
    r.before?.lens === 'phakic' && (r.before.axialLengthMm ?? 99) < 22
      ? { 'before.sphericalEquivalentDioptres': -10 }
      : null,
  ),
  refraction.wrong(
    ['wide-band-in-a-small-eye', 'caution', 'A broad element in a small hyperopic eye'],
    (r) => {
      const [first] = listAt(r, 'buckle.elements');
      if (first?.role !== 'encircling' || !encircles(r)) return null;
      return {
        'before.axialLengthMm': 20.4,
        'before.sphericalEquivalentDioptres': 6,
        'buckle.elements.0.widthMm': 7,
        'buckle.elements.0.form': 'tyre',
        'buckle.elements.0.thicknessMm': 2.75,
        'buckle.elements.0.lengthMm': undefined,
        ...(Array.isArray(first.fixation)
          ? {
              'buckle.elements.0.fixation': first.fixation.map((f) => ({
                ...f,
                biteMm: f.kind === 'scleral-tunnel' ? 7.5 : 9,
              })),
            }
          : {}),
        'buckle.elements.0.frontEdgeMm':
          first.frontEdgeReference === 'limbus' ? insertionMm(12, 'right') + 2 : 2,
      };
    },
  ),
  refraction.missing(
    ['change-of-glasses-left-blank', 'omission', 'An encircling band; the change of glasses is left blank'],
    'aftercare.refractiveChangeTold',
    encircles,
  ),
];
