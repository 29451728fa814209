import { clockwise, wrap } from '../globe.ts';
import { inFamily, listAt, vitrectomized } from './fault.ts';

const { wrong, missing } = inFamily('diagnosis');

export const diagnosisFaults = [
  wrong(
    ['giant-tear-without-one', 'contradiction', 'Giant tear in the diagnosis, none among the breaks'],
    (r) =>
      r.before?.diagnosis === 'rhegmatogenous' && listAt(r, 'breaks.found').length > 0
        ? { 'before.diagnosis': 'giant-tear', 'endOfCase.postoperativeDiagnosis': 'giant-tear' }
        : null,
  ),
  wrong(['dialysis-without-one', 'contradiction', 'Dialysis in the diagnosis, none among the breaks'], (r) =>
    r.before?.diagnosis === 'rhegmatogenous' && listAt(r, 'breaks.found').length > 0
      ? { 'before.diagnosis': 'dialysis', 'endOfCase.postoperativeDiagnosis': 'dialysis' }
      : null,
  ),
  wrong(
    ['giant-tear-without-vitreous-detachment', 'contradiction', 'Giant tear with the vitreous attached'],
    (r) => (r.before?.diagnosis === 'giant-tear' ? { 'before.posteriorVitreousDetachment': 'none' } : null),
  ),
  wrong(
    ['grade-of-1983-under-1991', 'contradiction', 'A grade of the 1983 classification under 1991'],
    (r) =>
      r.before?.pvr?.grade === 'CP' || r.before?.pvr?.grade === 'CA' ? { 'before.pvr.grade': 'D2' } : null,
  ),
  wrong(
    ['grade-of-1991-under-1983', 'contradiction', 'A grade of the 1991 classification under 1983'],
    (r) =>
      r.before?.pvr?.edition === '1983' && r.before.pvr.grade?.startsWith('C')
        ? { 'before.pvr.grade': 'CP' }
        : null,
  ),
  wrong(['grade-c-without-hours', 'omission', 'Grade C of 1991 without clock hours'], (r) =>
    r.before?.pvr?.edition === '1991' && r.before.pvr.grade?.startsWith('C')
      ? { 'before.pvr.clockHours': undefined }
      : null,
  ),
  wrong(['hours-for-grade-a', 'contradiction', 'Clock hours of membranes with grade A or none'], (r) =>
    r.before?.pvr?.grade === 'A' || r.before?.pvr?.grade === 'none' ? { 'before.pvr.clockHours': 7 } : null,
  ),
  missing(
    ['classification-not-named', 'omission', 'A grade C without its classification'],
    'before.pvr.edition',
    (r) => r.before?.pvr?.grade?.startsWith('C') ?? false,
  ),
  wrong(['no-pvr-but-membranes-peeled', 'contradiction', 'No PVR before, PVR membranes peeled'], (r) =>
    vitrectomized(r) && (r.vitreous?.membranesPeeled?.includes('preretinal') ?? false)
      ? { 'before.pvr.grade': 'none', 'before.pvr.clockHours': 'not-applicable' }
      : null,
  ),
  wrong(['macula-on-in-total-detachment', 'contradiction', 'Total detachment with the macula on'], (r) =>
    r.before?.totalDetachment === true
      ? { 'before.macula': 'on', 'before.maculaOffDays': 'not-applicable' }
      : null,
  ),
  wrong(['macula-on-yet-off-for-days', 'contradiction', 'Macula on, and days off counted'], (r) =>
    r.before?.macula === 'on' ? { 'before.maculaOffDays': 6 } : null,
  ),
  missing(['macula-not-stated', 'omission', 'Nothing said of the macula'], 'before.macula'),
  wrong(['macula-off-for-how-long', 'omission', 'Macula off, not said for how long'], (r) =>
    r.before?.macula === 'off' ? { 'before.maculaOffDays': undefined } : null,
  ),
  missing(['no-preoperative-diagnosis', 'omission', 'No diagnosis before surgery'], 'before.diagnosis'),
  wrong(
    ['diagnosis-changed-unexplained', 'caution', 'The diagnosis after is another, without a word'],
    (r) =>
      r.before?.diagnosis === 'rhegmatogenous' ? { 'endOfCase.postoperativeDiagnosis': 'tractional' } : null,
  ),
  wrong(['serous-with-breaks', 'contradiction', 'Serous detachment, yet breaks are listed'], (r) =>
    listAt(r, 'breaks.found').length > 0
      ? { 'before.diagnosis': 'serous', 'endOfCase.postoperativeDiagnosis': 'serous' }
      : null,
  ),
  wrong(['too-few-quadrants', 'contradiction', 'One quadrant for hours that cover three'], (r) =>
    (r.before?.quadrantsDetached ?? 0) >= 3 && r.before?.totalDetachment === false
      ? { 'before.quadrantsDetached': 1 }
      : null,
  ),
  wrong(['four-quadrants-for-one', 'contradiction', 'Four quadrants for hours that cover one'], (r) =>
    r.before?.quadrantsDetached === 1 ? { 'before.quadrantsDetached': 4 } : null,
  ),
  wrong(['total-with-one-quadrant', 'contradiction', 'Total detachment in a single quadrant'], (r) =>
    r.before?.totalDetachment === true ? { 'before.quadrantsDetached': 1 } : null,
  ),
  wrong(
    [
      'extent-the-long-way-round',
      'contradiction',
      'From and to changed over, so that the attached retina is called detached',
    ],
    (r) => {
      const { detachmentFromClock: from, detachmentToClock: to } = r.before ?? {};
      if (from === undefined || to === undefined || clockwise(from, to) > 5) return null;
      return { 'before.detachmentFromClock': to, 'before.detachmentToClock': from };
    },
  ),
  wrong(
    ['no-detachment-yet-hours', 'contradiction', 'A break without detachment, and hours of detachment'],
    (r) =>
      r.before?.diagnosis === 'rhegmatogenous' && r.before.detachmentFromClock !== undefined
        ? {
            'before.diagnosis': 'break-without-detachment',
            'endOfCase.postoperativeDiagnosis': 'break-without-detachment',
          }
        : null,
  ),
  wrong(['recurrence-without-history', 'contradiction', 'Recurrent, and no earlier operation'], (r) =>
    r.before?.recurrent === true ? { 'before.previousOperations': 'none' } : null,
  ),
  wrong(
    ['clear-lens-after-cataract-surgery', 'contradiction', 'Phakic after cataract surgery on this eye'],
    (r) =>
      r.before?.lens === 'pseudophakic' &&
      listAt(r, 'before.previousOperations').some((o) => o.what === 'cataract' && o.eye === r.who?.eye)
        ? { 'before.lens': 'phakic' }
        : null,
  ),
  missing(['lens-not-stated', 'omission', 'Nothing said of the lens'], 'before.lens'),
  missing(
    ['vitreous-not-stated', 'omission', 'Nothing said of the posterior vitreous'],
    'before.posteriorVitreousDetachment',
  ),
  wrong(['extent-not-stated', 'omission', 'The extent of the detachment is left out'], (r) =>
    r.before?.detachmentFromClock === undefined
      ? null
      : {
          'before.detachmentFromClock': undefined,
          'before.detachmentToClock': undefined,
          'before.quadrantsDetached': undefined,
          'before.totalDetachment': undefined,
        },
  ),
  wrong(
    [
      'break-far-from-the-highest-border',
      'caution',
      'The only break of a superior detachment is far from its upper border',
    ],
    (r) => {
      const [only, ...others] = listAt(r, 'breaks.found');
      const { detachmentFromClock: from, detachmentToClock: to } = r.before ?? {};
      if (only?.clock === undefined || others.length > 0 || from === undefined || to === undefined)
        return null;
      if (only.kind !== 'horseshoe' || clockwise(from, to) > 6 || only.supportedByElements !== 'none')
        return null;
      const higherIsTo = only.clock >= 9 && only.clock < 12 && to <= 12 && to > 9.5;
      if (!higherIsTo || from < 5.75 || from > 7.5) return null;
      const clock = wrap(from + 0.5);
      return {
        'breaks.found.0.clock': clock,
        'breaks.found.0.quadrant': only.quadrant?.replace('supero', 'infero'),
      };
    },
  ),
  missing(['pvr-not-graded', 'omission', 'PVR is not graded'], 'before.pvr'),
  missing(['recurrent-or-first', 'omission', 'Not said whether it is a recurrence'], 'before.recurrent'),
  wrong(
    [
      'pvr-edition-hours-over-four-quadrants',
      'contradiction',
      'Grade D, fixed folds all round, in one quadrant of detachment',
    ],
    (r) =>
      r.before?.pvr?.edition === '1983' &&
      r.before.totalDetachment === false &&
      r.before.pvr.grade?.startsWith('C')
        ? { 'before.pvr.grade': 'D2' }
        : null,
  ),
];
