import type { CaseRecord, Posture } from '../../../../src/domain/record/schema.ts';
import { fromTop } from '../globe.ts';
import { buckled, hasGas, hasLongGas, hasOil, inFamily, listAt, vitrectomized } from './fault.ts';

const { wrong, missing, inItem } = inFamily('posture');

const places = (r: CaseRecord) =>
  listAt(r, 'breaks.found').flatMap((b) =>
    b.clock === undefined || b.frontEdgeMm === undefined || b.backEdgeMm === undefined
      ? []
      : [{ clock: b.clock, mm: (b.frontEdgeMm + b.backEdgeMm) / 2 }],
  );

/** Degrees by which the lowest break lies under the top of the bubble. */
const lowest = (r: CaseRecord, position: Exclude<NonNullable<Posture['position']>, 'free'>) =>
  Math.max(...places(r).map((place) => fromTop(position, place, r.before?.axialLengthMm ?? 24)));
const highest = (r: CaseRecord, position: Exclude<NonNullable<Posture['position']>, 'free'>) =>
  Math.min(...places(r).map((place) => fromTop(position, place, r.before?.axialLengthMm ?? 24)));

const gassedWithBreaks = (r: CaseRecord) =>
  hasGas(r) && vitrectomized(r) && places(r).length > 0 && !buckled(r);

export const postureFaults = [
  missing(
    ['posture-not-stated', 'omission', 'Gas or oil, nothing said of posture'],
    'aftercare.posture',
    (r) => hasLongGas(r) || hasOil(r),
  ),
  wrong(['no-posture-with-gas', 'caution', 'Gas against breaks, posture none'], (r) =>
    gassedWithBreaks(r) && hasLongGas(r) ? { 'aftercare.posture': 'none' } : null,
  ),
  wrong(['free-with-gas', 'caution', 'Gas against breaks, no position needed'], (r) =>
    gassedWithBreaks(r) && hasLongGas(r) ? { 'aftercare.posture': [{ position: 'free', days: 7 }] } : null,
  ),
  wrong(
    [
      'sides-of-the-pillow-changed-over',
      'contradiction',
      'Lying on the wrong side, so that the break is at the bottom',
    ],
    (r) => {
      const posture = listAt(r, 'aftercare.posture');
      const [only] = posture;
      if (
        posture.length !== 1 ||
        (only?.position !== 'left-side' && only?.position !== 'right-side') ||
        !hasGas(r)
      )
        return null;
      const other = only.position === 'left-side' ? 'right-side' : 'left-side';
      return highest(r, other) > 110 ? { 'aftercare.posture.0.position': other } : null;
    },
  ),
  wrong(['upright-with-the-break-below', 'contradiction', 'Sitting up with all breaks below'], (r) =>
    gassedWithBreaks(r) && highest(r, 'upright') > 135
      ? { 'aftercare.posture': [{ position: 'upright', minutesAnHour: 50, days: 7 }] }
      : null,
  ),
  wrong(
    ['head-down-with-the-break-above', 'contradiction', 'Steeply head down with all breaks above'],
    (r) =>
      hasGas(r) && places(r).length > 0 && highest(r, 'steep-head-down') > 130
        ? { 'aftercare.posture': [{ position: 'steep-head-down', minutesAnHour: 50, days: 5 }] }
        : null,
  ),
  wrong(
    ['dry-side-in-a-pneumatic', 'contradiction', 'Pneumatic retinopexy with the break at the lowest place'],
    (r) => {
      if (!r.who?.performed?.includes('pneumatic-retinopexy') || places(r).length === 0) return null;
      const worst = (['left-side', 'right-side', 'face-down', 'upright'] as const).find(
        (position) => lowest(r, position) > 120 && highest(r, position) > 110,
      );
      return { 'aftercare.posture': [{ position: worst ?? 'steep-head-down', minutesAnHour: 50, days: 5 }] };
    },
  ),
  wrong(
    ['on-the-back-with-gas', 'caution', 'Flat on the back with gas: the bubble lies against the lens'],
    (r) =>
      gassedWithBreaks(r) && hasLongGas(r)
        ? { 'aftercare.posture': [{ position: 'supine', hoursADay: 16, days: 7 }] }
        : null,
  ),
  wrong(
    [
      'on-the-back-for-a-macular-hole',
      'contradiction',
      'Flat on the back with a macular hole under gas or light oil',
    ],
    (r) =>
      listAt(r, 'breaks.found').some((b) => b.kind === 'macular-hole') && r.tamponade?.agent !== 'heavy-oil'
        ? { 'aftercare.posture': [{ position: 'supine', hoursADay: 16, days: 7 }] }
        : null,
  ),
  wrong(
    ['head-down-with-heavy-oil', 'contradiction', 'Steeply head down with heavy oil for inferior breaks'],
    (r) =>
      r.tamponade?.agent === 'heavy-oil'
        ? { 'aftercare.posture': [{ position: 'steep-head-down', hoursADay: 14, days: 7 }] }
        : null,
  ),
  inItem(
    ['position-not-stated', 'omission', 'A posture without its position'],
    'aftercare.posture',
    (_, r) => (hasGas(r) ? { position: undefined } : null),
  ),
  inItem(['posture-for-how-long', 'omission', 'A posture without its days'], 'aftercare.posture', (p, r) =>
    hasGas(r) && p.position !== 'free' ? { days: undefined } : null,
  ),
  inItem(
    ['posture-how-much-of-the-day', 'omission', 'A posture without hours or minutes'],
    'aftercare.posture',
    (p, r) =>
      hasGas(r) && p.position !== 'free' ? { hoursADay: undefined, minutesAnHour: undefined } : null,
  ),
  inItem(['posture-for-three-months', 'caution', 'A posture for 90 days'], 'aftercare.posture', (p, r) =>
    hasGas(r) && p.position !== 'free' ? { days: 90 } : null,
  ),
  inItem(['posture-for-no-day', 'contradiction', 'A posture for no day'], 'aftercare.posture', (p, r) =>
    hasGas(r) && p.position !== 'free' ? { days: 0 } : null,
  ),
  wrong(['posture-without-anything-in-the-eye', 'caution', 'Face down for a week with no tamponade'], (r) =>
    r.tamponade?.agent === 'none' && r.aftercare?.posture === 'none'
      ? { 'aftercare.posture': [{ position: 'face-down', hoursADay: 16, days: 7 }] }
      : null,
  ),
  wrong(['days-of-posture-longer-than-the-air', 'caution', 'A month of posture for air'], (r) =>
    r.tamponade?.agent === 'air' && listAt(r, 'aftercare.posture').length === 1
      ? { 'aftercare.posture.0.days': 30 }
      : null,
  ),
  wrong(['note-against-the-posture', 'contradiction', 'The other advice names the opposite side'], (r) => {
    const only = listAt(r, 'aftercare.posture');
    if (only.length !== 1 || !only[0]?.position?.endsWith('-side')) return null;
    return {
      'aftercare.note': `Lie on the ${only[0].position === 'left-side' ? 'right' : 'left'} side day and night.`,
    };
  }),
];
