import { addDays, dateOf } from '../calendar.ts';
import { encircles, hasGas, hasLongGas, hasOil, inFamily } from './fault.ts';

const { wrong, missing, inItem } = inFamily('aftercare');
const letters = inFamily('letters');

export const aftercareFaults = [
  wrong(['flying-from-a-fixed-day', 'contradiction', 'A fixed day from which flying is allowed'], (r) =>
    hasGas(r) ? { 'aftercare.noFlyingUntil': addDays(dateOf(r.who?.endedAt ?? ''), 56) } : null,
  ),
  wrong(['flying-before-the-gas-can-be-gone', 'contradiction', 'Flying five days after C3F8'], (r) =>
    r.tamponade?.agent === 'C3F8'
      ? { 'aftercare.noFlyingUntil': addDays(dateOf(r.who?.endedAt ?? ''), 5) }
      : null,
  ),
  wrong(['not-told-of-flying', 'omission', 'Gas in the eye, not told of flying'], (r) =>
    hasLongGas(r) ? { 'aftercare.flyingAdviceGiven': false } : null,
  ),
  missing(
    ['flying-advice-left-blank', 'omission', 'Gas in the eye; flying left blank'],
    'aftercare.flyingAdviceGiven',
    hasLongGas,
  ),
  missing(
    ['no-end-to-not-flying', 'omission', 'Not said until when there is to be no flying'],
    'aftercare.noFlyingUntil',
    hasLongGas,
  ),
  wrong(['not-told-of-nitrous-oxide', 'omission', 'Gas in the eye, not told of nitrous oxide'], (r) =>
    hasLongGas(r) ? { 'aftercare.nitrousOxideAdviceGiven': false } : null,
  ),
  missing(
    ['nitrous-oxide-advice-left-blank', 'omission', 'Gas in the eye; nitrous oxide left blank'],
    'aftercare.nitrousOxideAdviceGiven',
    hasLongGas,
  ),
  wrong(['no-wristband', 'omission', 'Long gas without a wristband'], (r) =>
    hasLongGas(r) ? { 'aftercare.wristband': false } : null,
  ),
  missing(['wristband-left-blank', 'omission', 'Wristband left blank'], 'aftercare.wristband', hasLongGas),
  wrong(['no-drops', 'caution', 'No drops after the operation'], (r) =>
    r.who?.performed?.includes('pneumatic-retinopexy') ? null : { 'aftercare.drops': 'none' },
  ),
  missing(['drops-left-blank', 'omission', 'Drops left blank'], 'aftercare.drops'),
  wrong(['no-review', 'omission', 'No review'], () => ({
    'aftercare.reviewAt': undefined,
    'aftercare.reviewInDays': undefined,
  })),
  wrong(['review-in-a-year', 'caution', 'First review after 200 days'], (r) => ({
    'aftercare.reviewAt': `${addDays(dateOf(r.who?.endedAt ?? ''), 200)}T09:30`,
    'aftercare.reviewInDays': 200,
  })),
  missing(['warning-signs-left-blank', 'omission', 'Warning signs left blank'], 'aftercare.warningSigns'),
  wrong(['no-warning-sign-told', 'omission', 'No warning sign told'], () => ({
    'aftercare.warningSigns': [],
  })),
  missing(
    ['oil-stays-for-how-long', 'omission', 'Oil without a plan to remove it'],
    'aftercare.oilRemovalInMonths',
    (r) => hasOil(r) && r.aftercare?.nextOperationOn === undefined,
  ),
  wrong(['oil-out-at-once', 'caution', 'Oil to come out in no months'], (r) =>
    hasOil(r) ? { 'aftercare.oilRemovalInMonths': 0, 'aftercare.nextOperationOn': undefined } : null,
  ),
  wrong(
    ['removal-of-oil-that-is-not-there', 'contradiction', 'Removal of oil planned, gas in the eye'],
    (r) => (hasGas(r) ? { 'aftercare.oilRemovalInMonths': 4 } : null),
  ),
  wrong(
    [
      'oil-date-against-months',
      'contradiction',
      'Months to the removal of oil against the date of the next operation',
    ],
    (r) =>
      hasOil(r) && (r.aftercare?.oilRemovalInMonths ?? 0) >= 3
        ? { 'aftercare.nextOperationOn': addDays(dateOf(r.who?.endedAt ?? ''), 20) }
        : null,
  ),
  wrong(['flying-ban-with-oil', 'caution', 'Told not to fly for gas, oil in the eye'], (r) =>
    hasOil(r) ? { 'aftercare.wristband': true, 'aftercare.noFlyingUntil': 'surgeon-confirms' } : null,
  ),
  wrong(
    ['removal-of-an-element-that-is-not-there', 'contradiction', 'Release of an element, no element'],
    (r) => (r.buckle?.elements === 'none' ? { 'aftercare.elementRemovalInMonths': 3 } : null),
  ),
  missing(['driving-left-blank', 'omission', 'Driving left blank'], 'aftercare.driving'),
  missing(['activity-left-blank', 'omission', 'Activity left blank'], 'aftercare.activity'),
  missing(['where-to-after-surgery', 'omission', 'Where the patient goes is left blank'], 'aftercare.goesTo'),
  inItem(
    ['drop-every-hour-for-a-month', 'caution', 'A drop 24 times a day for four weeks'],
    'aftercare.drops',
    (d) => ((d.timesADay ?? 0) === 4 ? { timesADay: 24, weeks: 4 } : null),
  ),
  inItem(['drop-for-no-time', 'contradiction', 'A drop no times a day'], 'aftercare.drops', () => ({
    timesADay: 0,
  })),
  wrong(['told-of-glasses-not', 'omission', 'An encircling band; not told of the change of glasses'], (r) =>
    encircles(r) ? { 'aftercare.refractiveChangeTold': false } : null,
  ),
  wrong(['pad-left-off', 'caution', 'No pad or shield'], () => ({ 'endOfCase.shield': false })),
];

export const letterFaults = [
  letters.missing(
    ['family-doctor-not-named', 'omission', 'No family doctor to write to'],
    'who.familyDoctor',
  ),
  letters.missing(['referrer-not-named', 'omission', 'A referrer without a name'], 'who.referrer.name'),
  letters.missing(['referrer-left-blank', 'omission', 'Who referred is left blank'], 'who.referrer'),
  letters.missing(['review-place-not-stated', 'omission', 'Where the review is'], 'aftercare.reviewPlace'),
  letters.wrong(
    ['note-allows-flying', 'contradiction', 'The other advice allows flying after two weeks, gas in the eye'],
    (r) => (hasLongGas(r) ? { 'aftercare.note': 'May fly after two weeks.' } : null),
  ),
  letters.wrong(
    ['note-names-another-gas', 'contradiction', 'The other advice speaks of oil, gas in the eye'],
    (r) =>
      hasLongGas(r)
        ? { 'aftercare.note': 'Silicone oil is in the eye and will be removed in four months.' }
        : null,
  ),
  letters.wrong(
    ['note-names-the-fellow-eye', 'contradiction', 'The other advice names the wrong eye'],
    (r) => ({
      'aftercare.note': `Wear the shield over the operated ${r.who?.eye === 'right' ? 'left' : 'right'} eye at night.`,
    }),
  ),
  letters.wrong(['drug-strength-not-stated', 'omission', 'A drop without its strength'], (r) =>
    Array.isArray(r.aftercare?.drops) ? { 'aftercare.drops.0.strength': undefined } : null,
  ),
  letters.wrong(
    ['remarks-name-another-strength', 'contradiction', 'The remarks give another strength of gas'],
    (r) =>
      r.tamponade?.agent === 'SF6' && r.tamponade.mixing === 'diluted'
        ? { 'endOfCase.remarks': 'Exchange for SF6 30% was completed.' }
        : null,
  ),
  letters.wrong(
    [
      'remarks-name-another-hour',
      'contradiction',
      'The other findings give another clock hour for the only break',
    ],
    (r) => {
      const found = Array.isArray(r.breaks?.found) ? r.breaks.found : [];
      const clock = found[0]?.clock;
      if (found.length !== 1 || clock === undefined) return null;
      return { 'breaks.note': `Single break at ${Math.round((clock + 5) % 12) || 12} o’clock.` };
    },
  ),
];
