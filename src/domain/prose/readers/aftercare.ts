import type { CaseRecord } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { NUMBER, negatedAt, numberOf, sameNumber } from '../numbers.ts';

const postureWords: readonly (readonly [string, RegExp])[] = [
  ['face-down', /\bface[- ]?down\b|\bprone\b|\bon (?:his|her|their|your|the) front\b/g],
  ['upright', /\bupright\b|\bsit(?:ting)? up\b|\bhead up\b(?! \d)/g],
  [
    'right-side',
    /\b(?:right[- ]side(?:d)?[- ]?down|(?:on|onto|to) (?:(?:his|her|their|your|the) )?right side|right lateral(?: position| decubitus)?)\b/g,
  ],
  [
    'left-side',
    /\b(?:left[- ]side(?:d)?[- ]?down|(?:on|onto|to) (?:(?:his|her|their|your|the) )?left side|left lateral(?: position| decubitus)?)\b/g,
  ],
  ['right-cheek', /\bright cheek(?:[- ]down| to (?:the )?pillow)?\b/g],
  ['left-cheek', /\bleft cheek(?:[- ]down| to (?:the )?pillow)?\b/g],
];

const posturesOf = (record: CaseRecord) => {
  const posture = record.aftercare?.posture;
  return posture === undefined ? undefined : posture === 'none' ? [] : posture;
};

/** Positions on the table and head positions in an examination are not aftercare. */
const notAftercare =
  /\b(?:on the table|under the drapes|draped|positioned for|during (?:the )?(?:operation|surgery|exchange)|examin|anaesthe|block|transferred)\b/;

const readPosture: Reader = (clause, record) => {
  const postures = posturesOf(record);
  if (postures === undefined || notAftercare.test(clause.plain)) return [];
  const positions = postures.flatMap(({ position }) => (position === undefined ? [] : [position as string]));
  if (positions.length < postures.length || positions.includes('free')) return [];
  const recorded = positions.length === 0 ? 'no posture' : positions.join(', ').replaceAll('-', ' ');
  const found = postureWords.flatMap(([position, words]) =>
    [...clause.plain.matchAll(words)]
      .filter((match) => {
        const negated = negatedAt(clause.plain, match.index);
        const is =
          positions.includes(position) ||
          (position === 'face-down' && positions.some((one) => one.endsWith('cheek')));
        return negated ? positions.length === 1 && positions[0] === position : !is;
      })
      .map((match) => deny('posture', clause, spanOf(match), 'aftercare.posture', recorded)),
  );
  const none = [
    ...clause.plain.matchAll(/\bno (?:particular |special |specific )?(?:postur(?:e|ing)|positioning)\b/g),
  ];
  return postures.length > 0
    ? [
        ...found,
        ...none.map((match) => deny('posture', clause, spanOf(match), 'aftercare.posture', recorded)),
      ]
    : found;
};

const inDays: Readonly<Record<string, number>> = { day: 1, week: 7, month: 30, hour: 0, night: 1 };
const duration = new RegExp(
  `\\bfor (?:the (?:next|first) |about |another |a further )?(${NUMBER})[- ](day|night|week|month)s?\\b`,
  'g',
);
const aboutPosture = /\b(?:postur|position|face[- ]?down|side|upright|prone|cheek)/;
const aboutShield = /\bshield\b/;

const readDuration: Reader = (clause, record) => {
  const postures = posturesOf(record) ?? [];
  const days = postures.flatMap(({ days: value }) => (value === undefined ? [] : [value]));
  const nights = record.aftercare?.shieldNights;
  return [...clause.plain.matchAll(duration)].flatMap((match) => {
    const [, figure = '', unit = ''] = match;
    const said = numberOf(figure) * (inDays[unit] ?? 0);
    const before = clause.plain.slice(0, match.index);
    if (aboutShield.test(before)) {
      return nights === undefined || sameNumber(said, nights)
        ? []
        : [deny('duration', clause, spanOf(match), 'aftercare.shieldNights', `${nights} nights`)];
    }
    if (!aboutPosture.test(before) || days.length === 0 || days.length < postures.length) return [];
    return days.some((value) => sameNumber(value, said))
      ? []
      : [deny('duration', clause, spanOf(match), 'aftercare.posture.0.days', `${days.join(', ')} days`)];
  });
};

const months = [
  'january',
  'february',
  'march',
  'april',
  'may',
  'june',
  'july',
  'august',
  'september',
  'october',
  'november',
  'december',
];
const monthWord = `(?:${months.map((month) => `${month.slice(0, 3)}(?:${month.slice(3)})?`).join('|')}|sept)`;
const dateWords = new RegExp(
  `\\b(\\d{1,2})(?:st|nd|rd|th)?(?: of)? (${monthWord})\\.?,? (\\d{4})\\b|\\b(\\d{4})-(\\d{2})-(\\d{2})\\b`,
  'g',
);

const isoOf = (match: RegExpMatchArray): string => {
  const [, day = '', month = '', year = '', isoYear = '', isoMonth = '', isoDay = ''] = match;
  if (isoYear !== '') return `${isoYear}-${isoMonth}-${isoDay}`;
  const number = months.findIndex((name) => name.startsWith(month.slice(0, 3))) + 1;
  return `${year}-${String(number).padStart(2, '0')}-${day.padStart(2, '0')}`;
};

const aboutReview = /\b(?:review(?:ed)?|seen(?: again)?|appointment|clinic|follow-?up|come back|return)\b/;
const aboutOperation = /\b(?:operated(?: on)?|operation|surgery|underwent|procedure|performed|treated)\b/;

/** Dates of birth, of the referral and of operations to come are others. */
const notThisOperation = /\b(?:born|referral|referred|next|planned|removal|remove)\b/;

const readDate: Reader = (clause, record) => {
  const operated = record.who?.startedAt?.slice(0, 10);
  const review = record.aftercare?.reviewAt?.slice(0, 10);
  return [...clause.plain.matchAll(dateWords)].flatMap((match) => {
    const said = isoOf(match);
    const before = clause.plain.slice(0, match.index);
    if (aboutReview.test(before)) {
      return review === undefined || said === review
        ? []
        : [deny('date', clause, spanOf(match), 'aftercare.reviewAt', review)];
    }
    const near = before.slice(-40);
    if (!aboutOperation.test(near) || notThisOperation.test(near)) return [];
    return operated === undefined || said === operated
      ? []
      : [deny('date', clause, spanOf(match), 'who.startedAt', operated)];
  });
};

const perDay: readonly (readonly [RegExp, number])[] = [
  [/^once (?:a day|daily)|^daily|^od\b|^every (?:day|morning|night|evening)|^at night|^nocte/, 1],
  [/^twice (?:a day|daily)|^bd\b|^bid\b|^two times (?:a day|daily)|^every (?:12|twelve) hours/, 2],
  [/^three times (?:a day|daily)|^tds\b|^tid\b|^every (?:8|eight) hours/, 3],
  [/^four times (?:a day|daily)|^qds\b|^qid\b|^every (?:6|six) hours/, 4],
  [/^five times (?:a day|daily)/, 5],
  [/^six times (?:a day|daily)|^every (?:4|four) hours/, 6],
  [/^(?:every (?:2|two) hours|two-hourly|2-hourly)/, 12],
  [/^(?:hourly|every hour)/, 24],
];
const frequency =
  /\b(?:(?:once|twice|(?:two|three|four|five|six) times) (?:a day|daily)|(?:bd|bid|tds|tid|qds|qid|nocte)\b|every (?:\d+|two|four|six|eight|twelve) hours|every hour|hourly|(?:two|2)-hourly)/g;

/** Drops and tablets by name, how often and for how long. */
const readMedicine: Reader = (clause, record) => {
  const { drops, tablets } = record.aftercare ?? {};
  const courses = [
    ...(Array.isArray(drops)
      ? drops.map((course, at) => ({ ...course, field: `aftercare.drops.${at}` }))
      : []),
    ...(Array.isArray(tablets)
      ? tablets.map((course, at) => ({ ...course, field: `aftercare.tablets.${at}` }))
      : []),
  ];
  const found: ProseFinding[] = [];
  const named = courses
    .flatMap((course) => {
      const drug = course.drug?.toLowerCase().split(/\s+/)[0];
      const index = drug === undefined || drug.length < 4 ? -1 : clause.plain.indexOf(drug);
      return index < 0 ? [] : [{ ...course, index }];
    })
    .sort((a, b) => a.index - b.index);
  named.forEach((course, at) => {
    const end = named[at + 1]?.index ?? clause.plain.length;
    const part = clause.plain.slice(course.index, end);
    const times = [...part.matchAll(frequency)][0];
    const said = times === undefined ? undefined : perDay.find(([words]) => words.test(times[0]))?.[1];
    if (
      times !== undefined &&
      said !== undefined &&
      course.timesADay !== undefined &&
      said !== course.timesADay
    ) {
      const place = { index: course.index + times.index, length: times[0].length };
      found.push(
        deny('medicine', clause, place, `${course.field}.timesADay`, `${course.timesADay} times a day`),
      );
    }
    const long = [
      ...part.matchAll(new RegExp(`\\bfor (?:the next )?(${NUMBER})[- ](day|week|month)s?\\b`, 'g')),
    ][0];
    if (long !== undefined && course.weeks !== undefined) {
      const weeks = (numberOf(long[1] ?? '') * (inDays[long[2] ?? ''] ?? 0)) / 7;
      const monthly = long[2] === 'month' && Math.abs(weeks - course.weeks) < 0.5;
      if (!monthly && Math.abs(weeks - course.weeks) > 0.05) {
        const place = { index: course.index + long.index, length: long[0].length };
        found.push(deny('medicine', clause, place, `${course.field}.weeks`, `${course.weeks} weeks`));
      }
    }
    const strength = [...part.matchAll(/\b(\d+(?:[.,]\d+)?) ?%/g)][0];
    const recorded = course.strength?.match(/(\d+(?:[.,]\d+)?) ?%/);
    if (strength !== undefined && recorded !== null && recorded !== undefined) {
      if (!sameNumber(numberOf(strength[1] ?? ''), numberOf(recorded[1] ?? ''))) {
        const place = { index: course.index + strength.index, length: strength[0].length };
        found.push(deny('medicine', clause, place, `${course.field}.strength`, course.strength ?? ''));
      }
    }
  });
  return found;
};

/** Posture, durations, dates and medicines. */
export const readAftercare: Reader = (clause, record) =>
  clause.about === 'elsewhere'
    ? []
    : [
        ...readPosture(clause, record),
        ...readDuration(clause, record),
        ...readDate(clause, record),
        ...readMedicine(clause, record),
      ];
