import type { CaseRecord, Quadrant, RetinalBreak } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { negatedAt } from '../numbers.ts';
import { type Topics, topicAfter, topicBefore } from '../topic.ts';

const st = 'superotemporal';
const sn = 'superonasal';
const it = 'inferotemporal';
const inferonasal = 'inferonasal';

const words: readonly (readonly [readonly Quadrant[], RegExp])[] = [
  [[st], /\b(?:supero-?temporal(?:ly)?|(?:upper|superior)[- ](?:outer|temporal(?:ly)?))\b|\bst\b/g],
  [[sn], /\b(?:supero-?nasal(?:ly)?|(?:upper|superior)[- ](?:inner|nasal(?:ly)?))\b|\bsn\b/g],
  [[it], /\b(?:infero-?temporal(?:ly)?|(?:lower|inferior)[- ](?:outer|temporal(?:ly)?))\b|\bit\b/g],
  [[inferonasal], /\b(?:infero-?nasal(?:ly)?|(?:lower|inferior)[- ](?:inner|nasal(?:ly)?))\b|\bin\b/g],
  [[st, sn], /\b(?:superior(?:ly)?|upper)\b(?![- ](?:outer|inner|nasal|temporal|rect|limb))/g],
  [[it, inferonasal], /\b(?:inferior(?:ly)?|lower)\b(?![- ](?:outer|inner|nasal|temporal|rect|limb))/g],
  [
    [sn, inferonasal],
    /(?<!(?:upper|lower|superior|inferior)[- ])\bnasal(?:ly)?\b(?! (?:oxygen|cannula|rect|relieving))/g,
  ],
  [[st, it], /(?<!(?:upper|lower|superior|inferior)[- ])\btemporal(?:ly)?\b(?! (?:rect|arcade|artery))/g],
];

const quadrantAt = (clock: number, eye: 'right' | 'left'): Quadrant => {
  const at = ((clock % 12) + 12) % 12;
  const temporal = eye === 'left' ? at < 6 : at >= 6;
  return at < 3 || at >= 9 ? (temporal ? st : sn) : temporal ? it : inferonasal;
};

/** Quadrants that a break may be said to lie in; on a border both are right. */
const quadrantsOf = (
  { clock, extentClockHours = 0, quadrant }: RetinalBreak,
  eye: 'right' | 'left',
  half: boolean,
): Quadrant[] => {
  const named = quadrant === undefined ? [] : [quadrant];
  if (clock === undefined) return named;
  // A half is where the middle lies; the ends of a long break may reach into other quadrants.
  const reach = half ? 0.25 : Math.max(0.25, extentClockHours / 2);
  return [...named, ...[clock - reach, clock, clock + reach].map((hour) => quadrantAt(hour, eye))];
};

const quadrantsOfArc = (from: number, to: number, eye: 'right' | 'left'): Quadrant[] => {
  const hours = (((to - from) % 12) + 12) % 12;
  return Array.from({ length: Math.floor(hours * 2) }, (_, at) => quadrantAt(from + 0.25 + at / 2, eye));
};

const topics: Topics<'breaks' | 'closure' | 'iridectomy' | 'retinotomy' | 'element' | 'other'> = [
  [
    'breaks',
    /\b(?<!iris )(?:u-)?(?:tears?|holes?|breaks?|dialys[ie]s|horseshoe|hsts?|gst|grt|rhs?|defects?)\b/g,
  ],
  ['closure', /\b(?:sleeve|clip(?:ped)?|joined|ends)\b/g],
  ['iridectomy', /\b(?:iridectomy|pi)\b/g],
  ['retinotomy', /\bretin(?:ec|o)tomy\b/g],
  ['element', /\b(?:sponge|segment|tyre)\b/g],
  [
    'other',
    /\b(?:ports?|sclerotom\w*|infusion|chandelier|block|conjunctiva\w*|cut|vortex|arcade|iris|lattice|pigment\w*|fluid|detachment|rr?d|injected|gas|scars?|laser in|oxygen|membranes?|suture[sd]?|tunnels?|loops?|shaved|vitreous|quadrants? (?:was|were) flat|sub-tenon\w*)\b/g,
  ],
];

const allowedBy = (
  topic: string,
  record: CaseRecord,
  eye: 'right' | 'left',
  half: boolean,
): { field: string; quadrants: Quadrant[] } | undefined => {
  if (topic === 'breaks') {
    const all = Array.isArray(record.breaks?.found) ? record.breaks.found : [];
    const possible = all.map((one) => quadrantsOf(one, eye, half));
    return possible.some((quadrants) => quadrants.length === 0)
      ? undefined
      : { field: 'breaks.found.0.quadrant', quadrants: possible.flat() };
  }
  if (topic === 'iridectomy') {
    const where = record.tamponade?.iridectomy;
    if (where !== 'inferior' && where !== 'superior') return undefined;
    return { field: 'tamponade.iridectomy', quadrants: where === 'superior' ? [st, sn] : [it, inferonasal] };
  }
  if (topic === 'retinotomy') {
    const list = record.vitreous?.retinotomies;
    return {
      field: 'vitreous.retinotomies',
      quadrants: Array.isArray(list)
        ? list.flatMap(({ fromClock, toClock }) =>
            fromClock === undefined || toClock === undefined ? [] : quadrantsOfArc(fromClock, toClock, eye),
          )
        : [],
    };
  }
  const elements = Array.isArray(record.buckle?.elements) ? record.buckle.elements : [];
  if (topic === 'closure')
    return {
      field: 'buckle.elements.0.closure.quadrant',
      quadrants: elements.flatMap(({ closure }) =>
        typeof closure === 'object' && closure.quadrant !== undefined ? [closure.quadrant] : [],
      ),
    };
  const arcs = elements.filter(({ role }) => role !== 'encircling');
  return {
    field: 'buckle.elements',
    quadrants: arcs.flatMap(({ fromClock, toClock }) =>
      fromClock === undefined || toClock === undefined ? [] : quadrantsOfArc(fromClock, toClock, eye),
    ),
  };
};

const isShort = /^(?:st|sn|it|in)$/;

/** Quadrants of breaks, of the closure of a band, of elements, retinotomies and the iridectomy. */
export const readQuadrants: Reader = (clause, record) => {
  const eye = record.who?.eye;
  if (clause.about !== 'this-operation' || eye === undefined) return [];
  const { plain } = clause;
  const found: ProseFinding[] = [];
  for (const [quadrants, pattern] of words) {
    for (const match of plain.matchAll(pattern)) {
      const end = match.index + match[0].length;
      // "IT" and "IN" are capitals; in lower case they are words of their own.
      if (isShort.test(match[0]) && clause.text.slice(match.index, end) !== match[0].toUpperCase()) continue;
      if (
        negatedAt(plain, match.index) ||
        /^ retina (?:was|is|looked) (?:flat|free|normal|without)/.test(plain.slice(end))
      )
        continue;
      const before = topicBefore(plain, match.index, topics);
      const after = topicAfter(plain, end, topics);
      // An adjective belongs to what follows closely, an adverb to what came before.
      const close = after !== undefined && after.at - end < 24 && !match[0].endsWith('ly');
      const placed =
        before !== undefined && /\b(?:in|at) (?:the |its |both )?$/.test(plain.slice(before.at, match.index));
      const follows = close && !placed && !/[,;:]|\band\b/.test(plain.slice(end, after.at));
      const nearest = follows ? after : (before ?? after);
      if (nearest === undefined || nearest.topic === 'other') continue;
      const half = quadrants.length > 1;
      const gap = follows ? plain.slice(end, nearest.at) : plain.slice(nearest.at, match.index);
      if (half && gap.length > 28) continue;
      const allowed = allowedBy(nearest.topic, record, eye, half);
      if (allowed === undefined || allowed.quadrants.length === 0) continue;
      if (quadrants.some((quadrant) => allowed.quadrants.includes(quadrant))) continue;
      found.push(
        deny('quadrant', clause, spanOf(match), allowed.field, [...new Set(allowed.quadrants)].join(', ')),
      );
    }
  }
  return found;
};
