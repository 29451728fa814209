import type { CaseRecord } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader } from '../finding.ts';
import { negatedAt } from '../numbers.ts';
import { type Topics, topicAt } from '../topic.ts';

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
const hour = `(?:half past )?(?:1[0-2]|[1-9]|${hours.join('|')})(?:[:.](?:00|15|30|45))?`;
const unit = String.raw`(?: ?-?o ?'? ?clock| ?o[/.]?c\b\.?| ?h(?:rs?|ours?)?\b(?! (?:a|per|each)))`;
const joiner = String.raw`\s*(?:,? and|&|,|-|to|till|until|through|round to)\s*(?:at |a \w+ (?:hole|tear) at )?`;
const bare = String.raw`(?![\w%/]|[.,]\d| ?(?:mm|ml|mg|%|x|days?|weeks?|months?|nights?|minutes|min|quadrants?|breaks?|tears?|holes?|rows?|g|gauge|ports?|clock|times?|am|pm|times|spots|burns|applications)\b)`;
const sequence = new RegExp(
  `(?<![\\w:.,/-])(${hour})(?:${unit}|${bare})?(?:${joiner}(${hour})(?:${unit}|${bare}))*`,
  'g',
);
const oneHour = new RegExp(`${hour}`, 'g');
const anyUnit = new RegExp(`\\d${unit}|(?:${hours.join('|')})${unit}|[\\d]:(?:00|15|30|45)|half past`);

const hourOf = (words: string): number => {
  const past = words.startsWith('half past ') ? 0.5 : 0;
  const [whole = '', minutes] = words.replace('half past ', '').split(/[:.]/);
  const named = hours.indexOf(whole);
  return (named >= 0 ? named + 1 : Number(whole)) + past + (minutes === undefined ? 0 : Number(minutes) / 60);
};

/** Shortest way between two clock hours. */
const apart = (a: number, b: number) => {
  const d = Math.abs(a - b) % 12;
  return Math.min(d, 12 - d);
};

/** Whether an hour lies on the way clockwise from one hour to another, half an hour of grace at the ends. */
const within = (at: number, from: number, to: number) =>
  (((at - from + 0.5) % 12) + 12) % 12 <= ((((to - from) % 12) + 12) % 12) + 1;

const topics: Topics<
  'breaks' | 'detachment' | 'drainage' | 'lattice' | 'element' | 'retinotomy' | 'injection' | 'other'
> = [
  [
    'breaks',
    /\b(?<!iris )(?:u-)?(?:tears?|holes?|breaks?|dialys[ie]s|horseshoe|hsts?|gst|grt|rhs?|defects?)\b/g,
  ],
  ['detachment', /\b(?:detach(?:ed|ment)|rr?d|subretinal fluid (?!was)|srf(?! (?:was|drain)))\b/g],
  [
    'drainage',
    /\b(?:(?:externally |fluid |srf )?drain(?:ed|age)?(?! through)|edsrf|cut-?down|choroidotomy|let out|released)\b/g,
  ],
  ['lattice', /\blattice\b/g],
  ['element', /\b(?:tyre|sponge|segment|explant)\b/g],
  ['retinotomy', /\bretin(?:ec|o)tomy\b/g],
  ['injection', /\b(?:inject(?:ed|ion))\b/g],
  [
    'other',
    /\b(?:ports?|entry sites?|sclerotom\w*|infusion|light pipe|chandelier|peritomy|conjunctiva\w*|sleeve|clip\w*|joined|knots?|sutures?|wounds?|incision|iridectomy|paracentesis|axis|paving|pigment\w*|vortex|haemorrhage|scars?|post|meridi\w+al|come back|seen|telephoned?|rang|dose|bandage|starve|began|start\w*|ended|finished|clinic|ward|review\w*|appointment|discharged?|theatre|capsulorhexis)\b/g,
  ],
];

const showHour = (clock: number) => {
  const minute = Math.round((clock % 1) * 60);
  return minute === 0
    ? `${Math.floor(clock)} o’clock`
    : `${Math.floor(clock)}:${String(minute).padStart(2, '0')}`;
};

export interface Place {
  index: number;
  length: number;
  from: number;
  to: number;
}

/** Clock hours, lists and ranges of them. Bare figures count only beside a word that is placed by the clock. */
const placesIn = (plain: string): Place[] =>
  [...plain.matchAll(sequence)].flatMap((match): Place[] => {
    const words = match[0];
    const before = plain.slice(0, match.index);
    const isRange =
      /(?:\d|clock|o\/?c|[a-z]{3}) ?(?:-|to|till|until|through|round to) ?(?:half|\d|[a-z])/.test(
        words.replace(/o'?-?clock/g, 'oclock'),
      );
    const marked = anyUnit.test(words);
    const placed =
      isRange &&
      /\b(?:rr?d|retin(?:ec|o)tomy|sponge|tyre|segment|lattice|from|grt|detached)[: ]+$/.test(before);
    if (!marked && !placed) return [];
    const found = [...words.matchAll(oneHour)];
    const [first, second] = found;
    if (first === undefined) return [];
    const between = second !== undefined && found.length === 2 && /\bbetween $/.test(before);
    if (second !== undefined && found.length === 2 && (isRange || between))
      return [
        { index: match.index, length: words.trimEnd().length, from: hourOf(first[0]), to: hourOf(second[0]) },
      ];
    // "Over break 1, 8 o'clock": the first figure numbers the break.
    const numbered = /\b(?:break|element) $/.test(before) && /^\d,/.test(words) ? 1 : 0;
    return found.slice(numbered).map((one, at, list) => {
      const end = at === list.length - 1 ? words.trimEnd().length : one.index + one[0].length;
      return {
        index: match.index + one.index,
        length: end - one.index,
        from: hourOf(one[0]),
        to: hourOf(one[0]),
      };
    });
  });

interface Arc {
  from: number;
  to: number;
}

const sameArc = (place: Place, arc: Arc) =>
  apart(place.from, arc.from) <= 0.5 && apart(place.to, arc.to) <= 0.5;

const arcsOf = (
  list: readonly { fromClock?: number | undefined; toClock?: number | undefined }[] | 'none' | undefined,
): Arc[] =>
  Array.isArray(list)
    ? list.flatMap(({ fromClock: from, toClock: to }: { fromClock?: number; toClock?: number }) =>
        from === undefined || to === undefined ? [] : [{ from, to }],
      )
    : [];

const showArc = ({ from, to }: Arc) => `${showHour(from)} to ${showHour(to)}`;

/** The field and what is recorded there, when it denies the place. */
const denial = (
  topic: string | undefined,
  place: Place,
  record: CaseRecord,
): [string, string] | undefined => {
  const isRange = place.from !== place.to;
  if (topic === 'breaks') {
    const all = Array.isArray(record.breaks?.found) ? record.breaks.found : [];
    const clocks = all.flatMap(({ clock }) => (clock === undefined ? [] : [clock]));
    if (clocks.length === 0 || clocks.length < all.length) return undefined;
    const fits = all.some(({ clock = 0, extentClockHours = 0 }) =>
      isRange
        ? within(clock, place.from, place.to)
        : apart(clock, place.from) <= Math.max(0.5, extentClockHours / 2 + 0.25),
    );
    return fits ? undefined : ['breaks.found.0.clock', clocks.map(showHour).join(', ')];
  }
  if (topic === 'drainage') {
    const drained = record.drainage?.clock;
    return drained === undefined || isRange || apart(drained, place.from) <= 0.5
      ? undefined
      : ['drainage.clock', showHour(drained)];
  }
  if (topic === 'injection') {
    const at = record.tamponade?.injectedAtClock;
    return at === undefined || isRange || apart(at, place.from) <= 0.5
      ? undefined
      : ['tamponade.injectedAtClock', showHour(at)];
  }
  if (!isRange) return undefined;
  const { detachmentFromClock: from, detachmentToClock: to, totalDetachment } = record.before ?? {};
  const [field, arcs] =
    topic === 'detachment'
      ? ([
          'before.detachmentFromClock',
          from === undefined || to === undefined || totalDetachment === true ? [] : [{ from, to }],
        ] as const)
      : topic === 'lattice'
        ? (['breaks.lattice', arcsOf(record.breaks?.lattice)] as const)
        : topic === 'element'
          ? (['buckle.elements', arcsOf(record.buckle?.elements)] as const)
          : topic === 'retinotomy'
            ? (['vitreous.retinotomies', arcsOf(record.vitreous?.retinotomies)] as const)
            : (['', []] as const);
  return arcs.length === 0 || arcs.some((arc) => sameArc(place, arc))
    ? undefined
    : [field, arcs.map(showArc).join(', ')];
};

const thingBehind =
  /^(?:-| )?\s*(?:meridian\s*)?(?:horseshoe |round |retinal |operculated )*(?:tear|hole|break|dialysis)/;

/** Clock hours of breaks, detachment, drainage, lattice, elements, retinotomies and the injection. */
export const readClockHours: Reader = (clause, record) => {
  if (clause.about !== 'this-operation' || !/\d|clock|half past/.test(clause.plain)) return [];
  const found: ProseFinding[] = [];
  for (const place of placesIn(clause.plain)) {
    if (negatedAt(clause.plain, place.index)) continue;
    // "the 4 o'clock tear": the word right behind names the thing.
    const topic = thingBehind.test(clause.plain.slice(place.index + place.length))
      ? 'breaks'
      : topicAt(clause.plain, place, topics);
    const denied = denial(topic, place, record);
    if (denied !== undefined) found.push(deny('clock-hour', clause, place, ...denied));
  }
  return found;
};
