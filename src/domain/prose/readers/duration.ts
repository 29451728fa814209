import type { CaseRecord } from '../../record/schema.ts';
import type { Clause } from '../clause.ts';
import { deny, type ProseFinding, type Reader } from '../finding.ts';
import { NUMBER, numberOf } from '../numbers.ts';
import { type Topics, topicAfter, topicBefore } from '../topic.ts';
import { courseAt, coursesOf } from './courses.ts';

export interface Span {
  index: number;
  length: number;
  days: number;
  unit: 'hour' | 'minute' | 'day' | 'week' | 'month' | 'year';
}

const inDays: Readonly<Record<string, readonly [Span['unit'], number]>> = {
  minute: ['minute', 1 / 1440],
  min: ['minute', 1 / 1440],
  hour: ['hour', 1 / 24],
  day: ['day', 1],
  night: ['day', 1],
  week: ['week', 7],
  wk: ['week', 7],
  fortnight: ['week', 14],
  month: ['month', 30.4],
  year: ['year', 365],
  7: ['day', 1],
  52: ['week', 7],
  12: ['month', 30.4],
};

const spanWords = new RegExp(
  `(?:for (?:the (?:next|first) |about |another |a further )?)?(?<![\\w./:-])(?:(${NUMBER}|an?|one)[- ](minute|min|hour|day|night|week|wk|fortnight|month|year)s?\\b|(\\d{1,2})/(7|52|12)(?![/\\d]))`,
  'g',
);

/** Stretches of time, written out or as 5/7, 2/52, 3/12. */
export const spansIn = (plain: string): Span[] =>
  [...plain.matchAll(spanWords)].flatMap((match): Span[] => {
    const [words, figure, unit, short, over] = match;
    const known = inDays[unit ?? over ?? ''];
    if (known === undefined) return [];
    // "Twice a day" is how often, "for a day" how long.
    const lone =
      /^an? /.test(words) &&
      !/\b(?:in|within|after|of)(?: about| around)? $/.test(plain.slice(0, match.index));
    if (lone) return [];
    const number =
      short !== undefined ? Number(short) : /^an?$/.test(figure ?? '') ? 1 : numberOf(figure ?? '');
    return [{ index: match.index, length: words.length, days: number * known[1], unit: known[0] }];
  });

type Topic = 'posture' | 'shield' | 'review' | 'oil' | 'element' | 'macula' | 'course' | 'other';

const topics: Topics<Topic> = [
  [
    'posture',
    /\b(?:postur\w*|position\w*|face[- ]?down|(?:left|right|l|r)[- ]side|upright|prone|cheek|on (?:the|your|his|her) back)\b/g,
  ],
  ['shield', /\bshield\b/g],
  [
    'review',
    /\b(?:review(?:ed)?|seen(?: again)?|appointment|clinic|follow-?up|come back|return|see(?= (?:in|again))|next visit|see (?:her|him|them|you))\b/g,
  ],
  [
    'oil',
    /\b(?:oil (?:to|will|should|is to) (?:come|be)|removal of (?:silicone )?oil|oil removal|roso|oil out)\b/g,
  ],
  ['element', /\b(?:band|element|buckle) (?:to|will|should) (?:come|be (?:removed|released|cut))\b/g],
  ['macula', /\b(?:macula|mac|fovea)\w*[- :]+(?:(?:was|is|had|been|has) )*(?:off|detached)\b/g],
  [
    'other',
    /\b(?:symptoms?|floaters|lasts?|stays?|swimming|lifting|sport|work|driving|flying|glasses|sight|bruising|waited|took|surgery of|operation took|pressure|retire\w*|takes|will go|removed|bubble|gas lasts|laser was done)\b/g,
  ],
];

const sameDays = (said: Span, days: number) => {
  // Months and weeks are round figures: a month is four weeks or thirty days.
  const grace = said.unit === 'month' ? Math.max(3, days * 0.08) : said.unit === 'week' ? 1 : 0.5;
  return Math.abs(said.days - days) <= grace;
};

const deniedBy = (
  said: Span,
  record: CaseRecord,
  topic: Topic,
  perHour: boolean,
): [string, string] | undefined => {
  const { aftercare, before } = record;
  const against = (
    days: number | undefined,
    field: string,
    recorded: string,
  ): [string, string] | undefined =>
    days === undefined || sameDays(said, days) ? undefined : [field, recorded];
  if (topic === 'posture') {
    const postures = Array.isArray(aftercare?.posture) ? aftercare.posture : [];
    if (said.unit === 'hour') return undefined;
    if (perHour) {
      const minutes = postures.flatMap(({ minutesAnHour }) =>
        minutesAnHour === undefined ? [] : [minutesAnHour],
      );
      return minutes.length === 0 || minutes.some((value) => Math.abs(said.days * 1440 - value) < 0.5)
        ? undefined
        : ['aftercare.posture.0.minutesAnHour', `${minutes.join(', ')} min of each hour`];
    }
    if (said.unit === 'minute') return undefined;
    const days = postures.flatMap((posture) => (posture.days === undefined ? [] : [posture.days]));
    return days.length === 0 || days.length < postures.length || days.some((value) => sameDays(said, value))
      ? undefined
      : ['aftercare.posture.0.days', `${days.join(', ')} days`];
  }
  if (said.unit === 'hour' || said.unit === 'minute') return undefined;
  if (topic === 'shield')
    return against(aftercare?.shieldNights, 'aftercare.shieldNights', `${aftercare?.shieldNights} nights`);
  if (topic === 'review')
    return against(aftercare?.reviewInDays, 'aftercare.reviewInDays', `${aftercare?.reviewInDays} days`);
  if (topic === 'macula') {
    const days = typeof before?.maculaOffDays === 'number' ? before.maculaOffDays : undefined;
    return against(days, 'before.maculaOffDays', `${days} days`);
  }
  const months =
    topic === 'oil'
      ? aftercare?.oilRemovalInMonths
      : topic === 'element'
        ? aftercare?.elementRemovalInMonths
        : undefined;
  return months === undefined
    ? undefined
    : against(
        months * 30.4,
        topic === 'oil' ? 'aftercare.oilRemovalInMonths' : 'aftercare.elementRemovalInMonths',
        `${months} months`,
      );
};

const ofCourse = (clause: Clause, record: CaseRecord, said: Span): ProseFinding[] | undefined => {
  const course = courseAt(clause.plain, said.index, coursesOf(record));
  if (course === undefined) return undefined;
  // Posture, shield or review between the drug and the figure takes the figure away from the drug.
  const nearer = topicBefore(clause.plain, said.index, topics);
  if (nearer !== undefined && nearer.at > course.at) return undefined;
  const { weeks, field } = course.course;
  if (weeks === undefined || said.unit === 'hour' || said.unit === 'minute') return [];
  const fits = sameDays(said, weeks * 7) || (said.unit === 'month' && Math.abs(said.days / 7 - weeks) < 0.5);
  return fits ? [] : [deny('duration', clause, said, `${field}.weeks`, `${weeks} weeks`)];
};

/** How long: posture, shield, drops, macula off; how soon: review, removal of oil or element. */
export const readDuration: Reader = (clause, record) => {
  if (clause.about !== 'this-operation') return [];
  const { plain } = clause;
  return spansIn(plain).flatMap((said) => {
    const end = said.index + said.length;
    if (/^[- ](?:old|apart|later)\b/.test(plain.slice(end))) return [];
    const course = ofCourse(clause, record, said);
    if (course !== undefined) return course;
    const perHour =
      /^ ?(?:an hour|\/ ?h|per hour|in (?:each|every|an|the) hour|of (?:each|every|an) hour|(?:each|every) hour)/.test(
        plain.slice(end),
      );
    if (/^(?:an|each|every|one) hour$/.test(plain.slice(said.index, end))) return [];
    const topic = (topicBefore(plain, said.index, topics) ?? topicAfter(plain, end, topics))?.topic;
    if (topic === undefined || topic === 'other') return [];
    const denied = deniedBy(said, record, topic, perHour);
    return denied === undefined ? [] : [deny('duration', clause, said, ...denied)];
  });
};
