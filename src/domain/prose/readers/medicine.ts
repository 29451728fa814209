import type { CaseRecord } from '../../record/schema.ts';
import type { Clause } from '../clause.ts';
import { deny, type ProseFinding, type Reader } from '../finding.ts';
import { FIGURE, numberOf, sameNumber } from '../numbers.ts';
import { type Course, coursesOf, namedIn } from './courses.ts';

const counts: Readonly<Record<string, number>> = {
  once: 1,
  twice: 2,
  two: 2,
  three: 3,
  thrice: 3,
  four: 4,
  five: 5,
  six: 6,
  eight: 8,
  ten: 10,
  twelve: 12,
};
const latin: Readonly<Record<string, number>> = {
  od: 1,
  om: 1,
  on: 1,
  nocte: 1,
  mane: 1,
  bd: 2,
  bid: 2,
  tds: 3,
  tid: 3,
  qds: 4,
  qid: 4,
};
const hourly: Readonly<Record<string, number>> = {
  one: 1,
  two: 2,
  three: 3,
  four: 4,
  six: 6,
  eight: 8,
  twelve: 12,
};

const frequency =
  /\b(?:(once|twice|thrice) ?(?:a|per)? ?(?:day|daily)|(two|three|four|five|six|eight|ten|twelve|\d{1,2}) ?(?:times|x) ?(?:a |per |\/ ?)?(?:day|daily)|(?:x ?)?(\d{1,2})(?: ?x ?\/| ?\/| ) ?(?:day|daily)|(od|bd|bid|tds|tid|qds|qid|nocte|mane)\b|(o\.d\.|b\.d\.|t\.d\.s\.|q\.d\.s\.|b\.i\.d\.|t\.i\.d\.|q\.i\.d\.)|every (\d{1,2}|two|three|four|six|eight|twelve) hours|(every hour|hourly)|(two|three|four|\d)[- ]hourly|(daily|at night|every (?:day|morning|night)))/g;

const timesOf = (match: RegExpMatchArray): number | undefined => {
  const [, adverb, times, slash, short, dotted, every, hour, spaced, daily] = match;
  if (adverb !== undefined) return counts[adverb];
  if (times !== undefined) return counts[times] ?? Number(times);
  if (slash !== undefined) return Number(slash);
  if (short !== undefined) return latin[short];
  if (dotted !== undefined) return latin[dotted.replaceAll('.', '')];
  const gap = every ?? spaced;
  if (gap !== undefined) return 24 / (hourly[gap] ?? Number(gap));
  if (hour !== undefined) return 24;
  return daily === undefined ? undefined : 1;
};

const strengthWords = new RegExp(`(?<![\\d.,])(${FIGURE}) ?%`, 'g');
const doseWords = new RegExp(`(?<![\\d.,])(${FIGURE}) ?(mg|micrograms?|mcg|g)\\b`, 'g');
const routes: readonly (readonly [string, RegExp])[] = [
  ['subconjunctival', /\b(?:subconj(?:unctival(?:ly)?)?|s\/c|under the conjunctiva)\b/g],
  ['intracameral', /\b(?:intracameral(?:ly)?|into the anterior chamber)\b/g],
  ['intravitreal', /\bintravitreal(?:ly)?\b/g],
  ['sub-tenon', /\bsub-?tenon'?s?\b/g],
  ['intravenous', /\b(?:iv|intravenous(?:ly)?)\b/g],
  ['oral', /\boral(?:ly)?\b/g],
];

const milligrams = (figure: string, unit: string) =>
  numberOf(figure) * (unit === 'g' ? 1000 : unit.startsWith('mic') || unit === 'mcg' ? 0.001 : 1);

const doseOf = (dose: string | undefined): number | undefined => {
  const match = dose?.toLowerCase().match(/(\d+(?:[.,]\d+)?) ?(mg|micrograms?|mcg|g)\b/);
  return match === null || match === undefined ? undefined : milligrams(match[1] ?? '', match[2] ?? '');
};

/** A course that is to change later: what is said of it then is not what was ordered. */
const laterOn = /\b(?:from the|brought down|cut to|cut down|taper\w*|reduc\w*|then|afterwards)\b/;

interface Part {
  text: string;
  start: number;
}

const place = (part: Part, match: RegExpMatchArray) => ({
  index: part.start + (match.index ?? 0),
  length: match[0].trimEnd().length,
});

const frequencies = (clause: Clause, part: Part, meant: readonly Course[]): ProseFinding[] => {
  const courses = meant.filter(({ given, timesADay }) => !given && timesADay !== undefined);
  const [match] = part.text.matchAll(frequency);
  const said = match === undefined ? undefined : timesOf(match);
  // "OD" in capitals is the right eye.
  if (match === undefined || said === undefined || courses.length === 0) return [];
  const at = place(part, match);
  if (match[0] === 'od' && clause.text.slice(at.index, at.index + 2) === 'OD') return [];
  if (courses.some(({ timesADay }) => timesADay === said)) return [];
  const [course] = courses;
  return course === undefined
    ? []
    : [deny('medicine', clause, at, `${course.field}.timesADay`, `${course.timesADay} times a day`)];
};

const strengths = (clause: Clause, part: Part, meant: readonly Course[]): ProseFinding[] => {
  const recorded = meant.flatMap(({ strength, field }) => {
    const figure = strength?.match(/(\d+(?:[.,]\d+)?) ?%/)?.[1];
    return figure === undefined ? [] : [{ figure: numberOf(figure), field, strength }];
  });
  const [match] = part.text.matchAll(strengthWords);
  const [first] = recorded;
  if (match === undefined || first === undefined) return [];
  const said = numberOf(match[1] ?? '');
  return recorded.some(({ figure }) => sameNumber(figure, said))
    ? []
    : [deny('medicine', clause, place(part, match), `${first.field}.strength`, first.strength ?? '')];
};

/** "125 mg of cefuroxime": a dose right before the name, its offset below nought. */
const doseBefore = (plain: string, part: Part): RegExpExecArray[] => {
  const match = /(?:^|and |, |of |subconj\w* |with )(\d+(?:[.,]\d+)?) ?(mg|micrograms?|mcg|g) (?:of )?$/.exec(
    plain.slice(Math.max(0, part.start - 32), part.start),
  );
  if (match === null) return [];
  match.index -= Math.min(32, part.start);
  return [match];
};

const doses = (clause: Clause, part: Part, meant: readonly Course[]): ProseFinding[] => {
  const recorded = meant.flatMap(({ dose, strength, field, given }) => {
    const mg = doseOf(given ? dose : strength);
    return mg === undefined ? [] : [{ mg, field, words: (given ? dose : strength) ?? '' }];
  });
  const [match] = [...part.text.matchAll(doseWords), ...doseBefore(clause.plain, part)];
  const [first] = recorded;
  if (match === undefined || first === undefined) return [];
  const said = milligrams(match[1] ?? '', match[2] ?? '');
  return recorded.some(({ mg }) => sameNumber(mg, said))
    ? []
    : [
        deny(
          'medicine',
          clause,
          match.index < 0 ? { index: part.start + match.index, length: match[0].length } : place(part, match),
          first.field,
          first.words,
        ),
      ];
};

const routesOf = (clause: Clause, record: CaseRecord, meant: readonly Course[]): ProseFinding[] => {
  const recorded = meant.flatMap(({ given, route, field }) =>
    given && route !== undefined ? [{ route, field }] : [],
  );
  const [first] = recorded;
  if (first === undefined) return [];
  const all = Array.isArray(record.endOfCase?.medicines)
    ? record.endOfCase.medicines.map(({ route }) => route as string | undefined)
    : [];
  return routes.flatMap(([route, words]) =>
    recorded.some((one) => one.route === route) || all.includes(route)
      ? []
      : [...clause.plain.matchAll(words)]
          .slice(0, 1)
          .map((match) =>
            deny(
              'medicine',
              clause,
              { index: match.index, length: match[0].length },
              `${first.field}.route`,
              first.route.replace('-', ' '),
            ),
          ),
  );
};

const byMouth = /\b(?:oral(?:ly)?|by mouth|anaesthetist|sickness|allerg\w+|rash)\b/;

/** Drugs by name: dose, strength, how often, and the way they were given. */
export const readMedicine: Reader = (clause, record) => {
  if (clause.about !== 'this-operation' || laterOn.test(clause.plain) || byMouth.test(clause.plain))
    return [];
  const named = namedIn(clause.plain, coursesOf(record));
  const starts = [...new Set(named.map(({ at }) => at))];
  return starts.flatMap((start, index) => {
    const end = starts[index + 1] ?? clause.plain.length;
    const meant = named.filter(({ at }) => at === start).map(({ course }) => course);
    const part = { text: clause.plain.slice(start, end), start };
    return [
      ...frequencies(clause, part, meant),
      ...strengths(clause, part, meant),
      ...doses(clause, part, meant),
      ...routesOf(clause, record, meant),
    ];
  });
};
