import { z } from 'zod';
import {
  choice,
  choices,
  count,
  date,
  dateTime,
  group,
  listOrNone,
  longText,
  quantity,
  sides,
  text,
  yesNo,
} from '../fields.ts';

export const positions = {
  upright: 'upright',
  'face-down': 'face down',
  'right-side': 'lying on the right side',
  'left-side': 'lying on the left side',
  'right-cheek': 'face down, right cheek to the pillow',
  'left-cheek': 'face down, left cheek to the pillow',
  'supine-head-up-30': 'on the back, head up 30°',
  'supine-head-up-45': 'on the back, head up 45°',
  supine: 'flat on the back',
  'steep-head-down': 'steeply head down',
  free: 'no position needed',
} as const;

const posture = group('Posture', {
  position: choice('Position', positions),
  hoursADay: quantity('Hours a day', 'h', 0, 24),
  minutesAnHour: count('Minutes of each hour', 60, 'min'),
  days: count('For', 90, 'days'),
});

const course = {
  drug: text('Drug'),
  strength: text('Strength'),
  timesADay: count('Times a day', 24),
  weeks: quantity('For', 'weeks', 0, 52),
  note: text('Note'),
};

export const aftercare = group('Aftercare', {
  posture: listOrNone('Posture', 'posture', posture),
  flyingAdviceGiven: yesNo('Told not to fly while gas is in the eye'),
  noFlyingUntil: z.union([z.literal('surgeon-confirms'), date('Date')]).meta({
    title: 'No flying until',
    options: { 'surgeon-confirms': 'the surgeon confirms that the gas has gone' },
  }),
  nitrousOxideAdviceGiven: yesNo('Told of nitrous oxide'),
  wristband: yesNo('Wristband given'),
  drops: listOrNone('Drops', 'drop', group('Drop', { ...course, eye: choice('Eye', sides) })),
  tablets: listOrNone('Tablets', 'tablet', group('Tablet', course)),
  shieldNights: count('Shield at night', 90, 'nights'),
  activity: text('Activity'),
  driving: choice('Driving', {
    'not-until-review': 'not until reviewed',
    'as-rules': 'as the local rules allow',
  }),
  warningSigns: choices('Warning signs told', {
    pain: 'pain',
    'loss-of-sight': 'loss of sight',
    'new-shadow': 'a new shadow',
    redness: 'redness or discharge',
    nausea: 'nausea or vomiting',
  }),
  reviewAt: dateTime('Review'),
  reviewInDays: count('Review in', 400, 'days'),
  reviewPlace: text('Review at'),
  oilRemovalInMonths: quantity('Oil to come out in', 'months', 0, 120),
  elementRemovalInMonths: quantity('Element to be released or removed in', 'months', 0, 120),
  nextOperationOn: date('Next operation planned on'),
  refractiveChangeTold: yesNo('Told of the expected change of glasses'),
  goesTo: choice('Goes to', { home: 'home', ward: 'ward', 'other-hospital': 'another hospital' }),
  note: longText('Other advice'),
});
