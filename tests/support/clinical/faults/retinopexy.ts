import { inFamily, listAt, type vitrectomized } from './fault.ts';

const { wrong, missing, inItem } = inFamily('retinopexy');
type Subject = Parameters<typeof vitrectomized>[0];

const only = (r: Subject, name: string) => ({
  'who.performed': (r.who?.performed ?? []).filter((p) => p !== name),
  'who.planned': (r.who?.planned ?? []).filter((p) => p !== name),
});
const peripheral = (r: Subject) => listAt(r, 'breaks.found').some((b) => b.kind !== 'macular-hole');

export const retinopexyFaults = [
  wrong(['breaks-but-no-retinopexy', 'contradiction', 'Breaks said to be treated, retinopexy none'], (r) =>
    peripheral(r) ? { 'retinopexy.treatments': 'none' } : null,
  ),
  missing(
    ['retinopexy-left-blank', 'omission', 'Retinopexy left blank'],
    'retinopexy.treatments',
    peripheral,
  ),
  inItem(['break-left-untreated', 'omission', 'One break is listed as not treated'], 'breaks.found', (b) =>
    b.kind === 'macular-hole' || b.treatedBy?.includes('none') ? null : { treatedBy: ['none'] },
  ),
  inItem(
    [
      'treatment-of-a-break-not-stated',
      'omission',
      'Not said how a break was treated, and targets do not name it',
    ],
    'breaks.found',
    (b) => (b.kind === 'macular-hole' ? null : { treatedBy: undefined }),
  ),
  inItem(
    [
      'frozen-according-to-one-place-only',
      'contradiction',
      'A break called frozen; no cryotherapy was given',
    ],
    'breaks.found',
    (b, r) =>
      b.treatedBy?.includes('laser') && !listAt(r, 'retinopexy.treatments').some((t) => t.modality === 'cryo')
        ? { treatedBy: ['cryo'] }
        : null,
  ),
  inItem(
    ['lasered-according-to-one-place-only', 'contradiction', 'A break called lasered; no laser was given'],
    'breaks.found',
    (b, r) =>
      b.treatedBy?.includes('cryo') &&
      !listAt(r, 'retinopexy.treatments').some((t) => t.modality?.includes('laser'))
        ? { treatedBy: ['laser'] }
        : null,
  ),
  inItem(
    ['target-that-is-not-there', 'contradiction', 'Break 9 of two was treated'],
    'retinopexy.treatments',
    () => ({ targets: [9] }),
  ),
  inItem(
    ['one-break-missed-by-the-targets', 'contradiction', 'Targets leave out a break that is called treated'],
    'retinopexy.treatments',
    (t, r) =>
      t.targets === 'all-breaks' &&
      listAt(r, 'breaks.found').length >= 2 &&
      listAt(r, 'retinopexy.treatments').length === 1
        ? { targets: [1] }
        : null,
  ),
  inItem(
    ['endolaser-without-vitrectomy', 'contradiction', 'Endolaser in an eye that was not entered'],
    'retinopexy.treatments',
    (_, r) =>
      r.vitreous?.vitrectomy === false &&
      r.buckle?.elements !== 'none' &&
      !r.who?.performed?.includes('laser')
        ? { modality: 'endolaser', applications: 300 }
        : null,
  ),
  inItem(['targets-not-stated', 'omission', 'Treated, not said what'], 'retinopexy.treatments', () => ({
    targets: undefined,
  })),
  inItem(['modality-not-stated', 'omission', 'Treated, not said with what'], 'retinopexy.treatments', () => ({
    modality: undefined,
  })),
  inItem(
    ['no-spot-at-all', 'contradiction', 'A treatment with no application'],
    'retinopexy.treatments',
    () => ({ applications: 0 }),
  ),
  inItem(
    ['laser-power-with-a-nought-too-many', 'caution', 'Laser power ten times too large'],
    'retinopexy.treatments',
    (t) => (t.powerMilliwatts === undefined ? null : { powerMilliwatts: t.powerMilliwatts * 10 }),
  ),
  inItem(
    ['cryo-of-six-hundred', 'caution', 'Six hundred applications of cryotherapy'],
    'retinopexy.treatments',
    (t) => (t.modality === 'cryo' ? { applications: 600 } : null),
  ),
  inItem(
    ['cryo-with-laser-settings', 'contradiction', 'Laser power and time for cryotherapy'],
    'retinopexy.treatments',
    (t) => (t.modality === 'cryo' ? { powerMilliwatts: 250, durationMilliseconds: 200 } : null),
  ),
  wrong(['cryo-given-not-listed', 'contradiction', 'Cryotherapy not among the procedures'], (r) =>
    r.who?.performed?.includes('cryotherapy') ? only(r, 'cryotherapy') : null,
  ),
  wrong(['laser-given-not-listed', 'contradiction', 'Laser not among the procedures'], (r) =>
    r.who?.performed?.includes('laser') ? only(r, 'laser') : null,
  ),
  wrong(['cryo-listed-not-given', 'contradiction', 'Cryotherapy among the procedures, none given'], (r) =>
    r.who?.performed !== undefined && !r.who.performed.includes('cryotherapy') && peripheral(r)
      ? {
          'who.performed': [...r.who.performed, 'cryotherapy'],
          'who.planned': [...(r.who.planned ?? []), 'cryotherapy'],
        }
      : null,
  ),
  wrong(
    ['giant-tear-frozen-or-lasered', 'contradiction', 'Cryotherapy given, the giant tear called lasered'],
    (r) =>
      r.before?.diagnosis === 'giant-tear' && listAt(r, 'retinopexy.treatments').length === 1
        ? {
            'retinopexy.treatments.0.modality': 'cryo',
            'retinopexy.treatments.0.powerMilliwatts': undefined,
            'retinopexy.treatments.0.durationMilliseconds': undefined,
            'retinopexy.treatments.0.rows': undefined,
          }
        : null,
  ),
];
