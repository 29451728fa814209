import type { CaseRecord } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader } from '../finding.ts';
import { negatedAt } from '../numbers.ts';
import { type Topics, topicAfter, topicBefore } from '../topic.ts';

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
const month = `(?:${months.map((name) => (name.length > 3 ? `${name.slice(0, 3)}(?:${name.slice(3)})?` : name)).join('|')}|sept)\\b\\.?`;
const dates = new RegExp(
  [
    `\\b(\\d{1,2})(?:st|nd|rd|th)?(?: of)? (${month})(?:,? (\\d{4}))?`,
    `\\b(${month}) (\\d{1,2})(?:st|nd|rd|th)?\\b(?:,? (\\d{4})\\b)?`,
    '\\b(\\d{4})-(\\d{2})-(\\d{2})\\b',
    '(?<![\\d./-])(\\d{1,2})[./-](\\d{1,2})[./-](\\d{4}|\\d{2})(?![\\d/])',
    `\\b(?:in|of|since) (?:(${month}) )?((?:19|20)\\d\\d)\\b`,
  ].join('|'),
  'g',
);

/** Part of a date that is said: two dates agree in what both of them say. */
interface Said {
  index: number;
  length: number;
  year?: number | undefined;
  month?: number | undefined;
  day?: number | undefined;
}

const monthOf = (name: string | undefined) =>
  name === undefined ? undefined : months.findIndex((one) => one.startsWith(name.slice(0, 3))) + 1;
const number = (figure: string | undefined) => (figure === undefined ? undefined : Number(figure));
const yearOf = (figure: string | undefined) => {
  const year = number(figure);
  return year === undefined || year > 99 ? year : year > 40 ? 1900 + year : 2000 + year;
};

const datesIn = (plain: string): Said[] =>
  [...plain.matchAll(dates)].flatMap((match): Said[] => {
    const [words, d1, m1, y1, m2, d2, y2, y3, m3, d3, d4, m4, y4, m5, y5] = match;
    const said: Said = {
      index: match.index,
      length: words.length,
      year: yearOf(y1 ?? y2 ?? y3 ?? y4 ?? y5),
      month: monthOf(m1 ?? m2 ?? m5) ?? number(m3 ?? m4),
      day: number(d1 ?? d2 ?? d3 ?? d4),
    };
    const sound =
      (said.month ?? 1) >= 1 && (said.month ?? 1) <= 12 && (said.day ?? 1) >= 1 && (said.day ?? 1) <= 31;
    return sound ? [said] : [];
  });

const agrees = (said: Said, iso: string) => {
  const [year, monthNumber, day] = iso.slice(0, 10).split('-').map(Number);
  return (
    (said.year === undefined || said.year === year) &&
    (said.month === undefined || said.month === monthNumber) &&
    (said.day === undefined || said.day === day)
  );
};

type Topic =
  | 'birth'
  | 'review'
  | 'referral'
  | 'symptoms'
  | 'axial'
  | 'next'
  | 'cataract'
  | 'vitrectomy'
  | 'laser'
  | 'operation'
  | 'other';

const topics: Topics<Topic> = [
  ['birth', /\b(?:born|birth|dob|d\.o\.b)\b/g],
  [
    'review',
    /\b(?:review(?:ed)?|seen again|next visit|appointment|follow-?up|come back|return|(?:see|be seen|seen) (?:her|him|them|you|in (?:the )?clinic|again))\b/g,
  ],
  ['referral', /\b(?:referred|referral)\b/g],
  ['symptoms', /\b(?:symptoms?|onset)\b/g],
  ['axial', /\baxial length\b/g],
  ['next', /\b(?:next operation|planned|to come out|removal|oil out|roso)\b/g],
  ['cataract', /\bcataract\b/g],
  ['vitrectomy', /\b(?:first|previous|prior) (?:vitrectomy|ppv)\b/g],
  ['laser', /\blaser\b/g],
  [
    'operation',
    /\b(?:(?<!cataract )(?:operat(?:ed|ion)|surgery)|underwent|procedure|performed|repaired|treated|buckle|(?<!(?:first|previous|prior) )(?:vitrectomy|ppv)|pneumatic|(?:oil|gas|sf6|c3f8|c2f6)(?= (?:put in )?on)|op)\b/g,
  ],
  [
    'other',
    /\b(?:dictated|typed|letter|expir\w+|lot|flies|travels?|exams?|stopped|blood test|injury|retired|seen by|booked|scan|guidelines?|clinic)\b/g,
  ],
];

const previous = (record: CaseRecord, what: string, anyEye: boolean): { on: string; field: string }[] => {
  const list = record.before?.previousOperations;
  const eye = record.who?.eye;
  return Array.isArray(list)
    ? list.flatMap((one, at) =>
        one.what === what && one.on !== undefined && (anyEye || one.eye === eye)
          ? [{ on: one.on, field: `before.previousOperations.${at}.on` }]
          : [],
      )
    : [];
};

/** The dates that a topic may mean, by field; none when nothing is recorded. */
const meantBy = (topic: Topic, record: CaseRecord, history: boolean): { on: string; field: string }[] => {
  const at = (on: string | undefined, field: string) => (on === undefined ? [] : [{ on, field }]);
  switch (topic) {
    case 'birth':
      return at(record.who?.patient?.dateOfBirth, 'who.patient.dateOfBirth');
    case 'review':
      return at(record.aftercare?.reviewAt, 'aftercare.reviewAt');
    case 'referral':
      return at(record.who?.referrer?.referredOn, 'who.referrer.referredOn');
    case 'symptoms':
      return at(record.before?.symptomsSince, 'before.symptomsSince');
    case 'axial':
      return at(record.before?.axialLengthMeasuredOn, 'before.axialLengthMeasuredOn');
    case 'next':
      return at(record.aftercare?.nextOperationOn, 'aftercare.nextOperationOn');
    case 'cataract':
      return previous(record, 'cataract', true);
    case 'vitrectomy':
      return previous(record, 'vitrectomy', false);
    case 'laser':
      return history ? previous(record, 'laser', false) : at(record.who?.startedAt, 'who.startedAt');
    case 'operation':
      return at(record.who?.startedAt, 'who.startedAt');
    default:
      return [];
  }
};

const otherEyeOrWish = /\b(?:if|would|could|might|fellow|other eye|guidelines?)\b/;
const clock = /\b(?:at )?([01]?\d|2[0-3])[:.]([0-5]\d)\b(?!\.\d|\/| ?mm| ?%)/g;

/** The hour of the review beside its date. */
const readTime = (
  plain: string,
  record: CaseRecord,
): { index: number; length: number; recorded: string } | undefined => {
  const recorded = record.aftercare?.reviewAt?.slice(11, 16);
  if (recorded === undefined || !/\b(?:review|appointment)\b/.test(plain)) return undefined;
  for (const match of plain.replace(dates, (words) => ' '.repeat(words.length)).matchAll(clock)) {
    const said = Number(match[1]) * 60 + Number(match[2]);
    const [h = 0, m = 0] = recorded.split(':').map(Number);
    if (said !== h * 60 + m && said + 720 !== h * 60 + m)
      return { index: match.index, length: match[0].length, recorded };
  }
  return undefined;
};

/** Dates of birth, referral, symptoms, measurement, this operation, earlier ones and the review. */
export const readDate: Reader = (clause, record) => {
  const { plain } = clause;
  if (!/\d/.test(plain) || otherEyeOrWish.test(plain)) return [];
  // A year in the past makes history of a clause; here its date is what is read.
  if (clause.about === 'elsewhere' && !/\breferred|referral\b/.test(plain)) return [];
  const found: ProseFinding[] = [];
  for (const said of datesIn(plain)) {
    if (negatedAt(plain, said.index)) continue;
    const topic = (
      topicBefore(plain, said.index, topics) ?? topicAfter(plain, said.index + said.length, topics)
    )?.topic;
    if (topic === undefined) continue;
    const history = said.day === undefined || clause.about === 'history';
    if (topic === 'operation' && history && said.day === undefined) continue;
    const meant = meantBy(topic, record, history);
    const [first] = meant;
    if (first === undefined || meant.some(({ on }) => agrees(said, on))) continue;
    found.push(deny('date', clause, said, first.field, meant.map(({ on }) => on.slice(0, 10)).join(', ')));
  }
  const time = clause.about === 'this-operation' ? readTime(plain, record) : undefined;
  if (time !== undefined) found.push(deny('date', clause, time, 'aftercare.reviewAt', time.recorded));
  return found;
};
