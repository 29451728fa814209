import type { CaseRecord, Quadrant, RetinalBreak } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { negatedAt } from '../numbers.ts';

const hours = [
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];
const hourWord = `(?:1[0-2]|[1-9]|${hours.join('|')})`;
const oclock = String.raw`(?: ?o ?'? ?clock| ?oc\b| ?h(?:rs?|ours?)?\b(?! (?:a|per|each)))`;
const minutes = '(?:[:.](?:00|15|30|45))?';
const single = new RegExp(`(?<![\\w:.,/-])(?:half past )?(${hourWord})(${minutes})${oclock}`, 'g');
const written = /(?<![\w:.,/-])(1[0-2]|[1-9]):(00|15|30|45)(?![\d:])(?! ?(?:am|pm|hrs?|hours|h)\b)/g;
const range = new RegExp(
  `(?<![\\w:.,/-])(?:half past )?(${hourWord})(${minutes})(?:${oclock})?\\s*(?:-|to|till|until|and|through|round to|around to)\\s*(${hourWord})(${minutes})${oclock}`,
  'g',
);

const hourOf = (hour: string, past: string, words: string): number => {
  const named = hours.indexOf(hour);
  const whole = named >= 0 ? named + 1 : Number(hour);
  const part = past === '' ? 0 : Number(past.slice(1)) / 60;
  return whole + part + (words.startsWith('half past') ? 0.5 : 0);
};

/** Shortest way between two clock hours. */
const apart = (a: number, b: number) => {
  const d = Math.abs(a - b) % 12;
  return Math.min(d, 12 - d);
};

/** Whether an hour lies on the way clockwise from one hour to another, half an hour of grace at the ends. */
const within = (hour: number, from: number, to: number) =>
  (((hour - from + 0.5) % 12) + 12) % 12 <= ((((to - from) % 12) + 12) % 12) + 1;

const aboutBreaks = /\b(?:tears?|holes?|breaks?|dialysis|dialyses|horseshoe|hst|gst|grt|u-tear|defects?)\b/;
const aboutDetachment = /\b(?:detach(?:ed|ment)|rd|rrd|subretinal fluid|srf)\b/;
const aboutDrainage = /\b(?:drain(?:ed|age)?|cut-?down|choroidotomy)\b/;
const otherThings =
  /\b(?:port|sclerotom|infusion|light pipe|peritomy|conjunctiva|sleeve|joined|knot|suture|wound|incision|iridectom|paracentesis|lattice|explant|buckle from|segment from|element|axis|paving|pigment|vortex|haemorrhage|laser scars?|scar|retinotomy|retinectomy|post|band from|meridi)/;

const foundBreaks = (record: CaseRecord): RetinalBreak[] =>
  Array.isArray(record.breaks?.found) ? record.breaks.found : [];

const showHour = (clock: number) => {
  const minute = Math.round((clock % 1) * 60);
  return minute === 0
    ? `${Math.floor(clock)} o’clock`
    : `${Math.floor(clock)}:${String(minute).padStart(2, '0')}`;
};

interface Place {
  index: number;
  length: number;
  from: number;
  to: number;
}

const placesIn = (plain: string): Place[] => {
  const places: Place[] = [];
  const free = (index: number) =>
    places.every((place) => index < place.index || index >= place.index + place.length);
  for (const match of plain.matchAll(range)) {
    const [words, a = '', am = '', b = '', bm = ''] = match;
    places.push({ ...spanOf(match), from: hourOf(a, am, words), to: hourOf(b, bm, '') });
  }
  for (const match of [...plain.matchAll(single), ...plain.matchAll(written)]) {
    if (!free(match.index)) continue;
    const [words, hour = '', past = ''] = match;
    const at = hourOf(hour, past === '' || /^[:.]/.test(past) ? past : `:${past}`, words);
    places.push({ ...spanOf(match), from: at, to: at });
  }
  return places.sort((a, b) => a.index - b.index);
};

const extentOf = (record: CaseRecord): { from: number; to: number } | undefined => {
  const { detachmentFromClock: from, detachmentToClock: to, totalDetachment } = record.before ?? {};
  return from === undefined || to === undefined || totalDetachment === true ? undefined : { from, to };
};

/** What the nearest words before a place speak of; after it when nothing stands before. */
const subjectAt = (
  plain: string,
  place: Place,
): 'breaks' | 'detachment' | 'drainage' | 'other' | undefined => {
  const subjects = [
    ['breaks', aboutBreaks],
    ['detachment', aboutDetachment],
    ['drainage', aboutDrainage],
    ['other', otherThings],
  ] as const;
  const lastIn = (text: string) =>
    subjects
      .map(([name, words]) => ({ name, at: [...text.matchAll(new RegExp(words, 'g'))].at(-1)?.index ?? -1 }))
      .filter(({ at }) => at >= 0)
      .sort((a, b) => b.at - a.at)[0]?.name;
  const firstIn = (text: string) =>
    subjects
      .map(([name, words]) => ({ name, at: text.search(words) }))
      .filter(({ at }) => at >= 0)
      .sort((a, b) => a.at - b.at)[0]?.name;
  const after = plain.slice(place.index + place.length);
  // "the 4 o'clock tear": the word right behind names the thing.
  if (/^\s*(?:horseshoe |round |retinal |operculated )*(?:tear|hole|break|dialysis)/.test(after))
    return 'breaks';
  return lastIn(plain.slice(0, place.index)) ?? firstIn(after);
};

/** Clock hours of breaks, of the detachment and of drainage. */
export const readClockHours: Reader = (clause, record) => {
  if (clause.about === 'elsewhere') return [];
  const found: ProseFinding[] = [];
  const all = foundBreaks(record);
  const clocks = all.flatMap(({ clock }) => (clock === undefined ? [] : [clock]));
  const extent = extentOf(record);
  for (const place of placesIn(clause.plain)) {
    if (negatedAt(clause.plain, place.index)) continue;
    const subject = subjectAt(clause.plain, place);
    const isRange = place.from !== place.to;
    if (subject === 'breaks' && clocks.length > 0 && clocks.length === all.length) {
      const fits = all.some(({ clock = 0, extentClockHours = 0 }) =>
        isRange
          ? within(clock, place.from, place.to)
          : apart(clock, place.from) <= Math.max(0.5, extentClockHours / 2 + 0.25),
      );
      if (!fits)
        found.push(
          deny('clock-hour', clause, place, 'breaks.found.0.clock', clocks.map(showHour).join(', ')),
        );
    }
    if (subject === 'detachment' && extent !== undefined && isRange) {
      if (apart(place.from, extent.from) > 0.5 || apart(place.to, extent.to) > 0.5) {
        const recorded = `${showHour(extent.from)} to ${showHour(extent.to)}`;
        found.push(deny('clock-hour', clause, place, 'before.detachmentFromClock', recorded));
      }
    }
    const drained = record.drainage?.clock;
    if (subject === 'drainage' && drained !== undefined && !isRange && apart(drained, place.from) > 0.5) {
      found.push(deny('clock-hour', clause, place, 'drainage.clock', showHour(drained)));
    }
  }
  return found;
};

const quadrantWords: readonly (readonly [Quadrant, RegExp])[] = [
  [
    'superotemporal',
    /\b(?:supero-?temporal(?:ly)?|st quadrant|upper (?:outer|temporal)|superior temporal)\b/g,
  ],
  ['superonasal', /\b(?:supero-?nasal(?:ly)?|sn quadrant|upper (?:inner|nasal)|superior nasal)\b/g],
  [
    'inferotemporal',
    /\b(?:infero-?temporal(?:ly)?|it quadrant|lower (?:outer|temporal)|inferior temporal)\b/g,
  ],
  ['inferonasal', /\b(?:infero-?nasal(?:ly)?|in quadrant|lower (?:inner|nasal)|inferior nasal)\b/g],
];

/** Quadrants that a break may be said to lie in; on a border both are right. */
const quadrantsOf = (found: RetinalBreak, eye: 'right' | 'left'): Quadrant[] => {
  const { clock, extentClockHours = 0, quadrant } = found;
  const named = quadrant === undefined ? [] : [quadrant];
  if (clock === undefined) return named;
  const reach = Math.max(0.25, extentClockHours / 2);
  const touched = [clock - reach, clock, clock + reach].map((hour): Quadrant => {
    const at = ((hour % 12) + 12) % 12;
    const upper = at < 3 || at >= 9;
    const temporal = eye === 'left' ? at < 6 : at >= 6;
    if (upper) return temporal ? 'superotemporal' : 'superonasal';
    return temporal ? 'inferotemporal' : 'inferonasal';
  });
  return [...named, ...touched];
};

/** Quadrant of a break. */
export const readQuadrants: Reader = (clause, record) => {
  const eye = record.who?.eye;
  const all = foundBreaks(record);
  if (
    clause.about === 'elsewhere' ||
    eye === undefined ||
    all.length === 0 ||
    !aboutBreaks.test(clause.plain)
  )
    return [];
  const possible = all.map((one) => quadrantsOf(one, eye));
  if (possible.some((quadrants) => quadrants.length === 0)) return [];
  const allowed = new Set(possible.flat());
  return quadrantWords.flatMap(([quadrant, words]) =>
    allowed.has(quadrant)
      ? []
      : [...clause.plain.matchAll(words)]
          .filter((match) => {
            const place = { ...spanOf(match), from: 0, to: 0 };
            return subjectAt(clause.plain, place) === 'breaks' && !negatedAt(clause.plain, match.index);
          })
          .map((match) =>
            deny('quadrant', clause, spanOf(match), 'breaks.found.0.quadrant', [...allowed].join(', ')),
          ),
  );
};
