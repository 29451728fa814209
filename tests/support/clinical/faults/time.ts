import { addDays, addMinutes, dateOf } from '../calendar.ts';
import { general, hasLongGas, inFamily } from './fault.ts';

const { wrong, missing, inItem } = inFamily('time');

const day = (r: { who?: { startedAt?: string | undefined } | undefined }) =>
  dateOf(r.who?.startedAt ?? '2026-01-01T09:00');

export const timeFaults = [
  wrong(['ended-before-it-started', 'contradiction', 'Start and end are changed over'], (r) => ({
    'who.startedAt': r.who?.endedAt,
    'who.endedAt': r.who?.startedAt,
  })),
  wrong(['end-dated-the-next-day', 'caution', 'The end is dated a day late'], (r) => ({
    'who.endedAt': addMinutes(r.who?.endedAt ?? '', 1440),
  })),
  wrong(['end-dated-a-month-late', 'contradiction', 'The end is dated the next month'], (r) => ({
    'who.endedAt': addMinutes(r.who?.endedAt ?? '', 30 * 1440),
  })),
  wrong(['two-minute-operation', 'caution', 'Start and end two minutes apart'], (r) =>
    r.who?.performed?.includes('pneumatic-retinopexy')
      ? null
      : { 'who.endedAt': addMinutes(r.who?.startedAt ?? '', 2) },
  ),
  wrong(['time-out-after-the-first-cut', 'contradiction', 'The time-out is timed after the start'], (r) => ({
    'who.timeOutAt': addMinutes(r.who?.startedAt ?? '', 12),
  })),
  wrong(['time-out-on-another-day', 'caution', 'The time-out is dated the day before'], (r) => ({
    'who.timeOutAt': addMinutes(r.who?.timeOutAt ?? '', -1440),
  })),
  missing(['start-not-timed', 'omission', 'No start'], 'who.startedAt'),
  missing(['end-not-timed', 'omission', 'No end'], 'who.endedAt'),
  missing(['time-out-not-timed', 'omission', 'No time of the time-out'], 'who.timeOutAt'),
  wrong(['symptoms-after-the-operation', 'contradiction', 'Symptoms begin after the operation'], (r) => ({
    'before.symptomsSince': addDays(day(r), 9),
  })),
  wrong(['referred-after-the-operation', 'contradiction', 'Referred after the operation'], (r) =>
    r.who?.referrer?.referredOn === undefined ? null : { 'who.referrer.referredOn': addDays(day(r), 6) },
  ),
  wrong(['born-after-the-operation', 'contradiction', 'Date of birth after the operation'], (r) => ({
    'who.patient.dateOfBirth': addDays(day(r), 3),
  })),
  wrong(['age-of-a-hundred-and-forty', 'contradiction', 'Date of birth a century too early'], (r) =>
    (r.who?.patient?.dateOfBirth ?? '9') < '1990'
      ? { 'who.patient.dateOfBirth': addDays(r.who?.patient?.dateOfBirth ?? '', -36525) }
      : null,
  ),
  wrong(
    [
      'nitrous-oxide-stopped-after-the-end',
      'contradiction',
      'Nitrous oxide stopped after the end of the operation',
    ],
    (r) =>
      general(r)
        ? {
            'anaesthesia.nitrousOxideUsed': true,
            'anaesthesia.nitrousOxideStoppedAt': addMinutes(r.who?.endedAt ?? '', 120),
          }
        : null,
  ),
  inItem(
    ['drug-given-before-the-patient-came', 'contradiction', 'A drug is timed the day before'],
    'endOfCase.medicines',
    (m) => (m.givenAt === undefined ? null : { givenAt: addMinutes(m.givenAt, -1440) }),
  ),
  inItem(
    ['drug-given-a-month-later', 'contradiction', 'A drug is timed a month after the operation'],
    'endOfCase.medicines',
    (m) => (m.givenAt === undefined ? null : { givenAt: addMinutes(m.givenAt, 30 * 1440) }),
  ),
  wrong(
    ['review-before-the-operation', 'contradiction', 'The review is dated before the operation'],
    (r) => ({
      'aftercare.reviewAt': `${addDays(day(r), -5)}T09:30`,
    }),
  ),
  wrong(
    ['review-days-do-not-fit-the-date', 'contradiction', 'Days to the review do not fit its date'],
    (r) => ({
      'aftercare.reviewInDays': (r.aftercare?.reviewInDays ?? 1) + 13,
    }),
  ),
  wrong(
    ['next-operation-before-this-one', 'contradiction', 'The next operation is dated before this one'],
    (r) => ({
      'aftercare.nextOperationOn': addDays(day(r), -30),
    }),
  ),
  wrong(
    [
      'eye-measured-after-the-operation',
      'contradiction',
      'The length of the eye was measured after the operation',
    ],
    (r) => ({
      'before.axialLengthMeasuredOn': addDays(day(r), 12),
    }),
  ),
  wrong(
    ['macula-off-longer-than-symptoms', 'caution', 'Macula off for longer than there were symptoms'],
    (r) =>
      typeof r.before?.maculaOffDays === 'number'
        ? { 'before.maculaOffDays': r.before.maculaOffDays + 400 }
        : null,
  ),
  inItem(
    ['earlier-operation-after-this-one', 'contradiction', 'An earlier operation is dated after this one'],
    'before.previousOperations',
    (_, r) => ({
      on: addDays(day(r), 40),
    }),
  ),
  wrong(
    [
      'heavy-liquid-out-before-it-went-in',
      'contradiction',
      'Heavy liquid is to be removed before the operation',
    ],
    (r) =>
      r.vitreous?.heavyLiquid === 'left'
        ? { 'vitreous.heavyLiquidRemovalPlannedOn': addDays(day(r), -3) }
        : null,
  ),
  wrong(['gas-out-of-date', 'contradiction', 'The gas had expired'], (r) =>
    hasLongGas(r) ? { 'tamponade.expiresOn': addDays(day(r), -20) } : null,
  ),
  wrong(['symptoms-for-thirty-years', 'caution', 'Symptoms are dated thirty years ago'], (r) => ({
    'before.symptomsSince': addDays(r.before?.symptomsSince ?? '', -10958),
  })),
];
