import type { CaseRecord } from '../../record/schema.ts';
import { deny, type Reader, spanOf } from '../finding.ts';
import { NUMBER, negatedAt, numberOf } from '../numbers.ts';

const breakCount = new RegExp(
  `(?<![\\w.,:/-])(${NUMBER}|a (?:single|solitary)|single|a pair of|a couple of|multiple|several|both|no) (?:(?:retinal|small|large|horseshoe|round|atrophic|operculated|peripheral|further|separate|treated|flat) )*(tears?|holes?|breaks?|hsts?|rhs?)\\b`,
  'g',
);

const kindOf: Readonly<Record<string, readonly string[]>> = {
  tear: ['horseshoe', 'giant-tear', 'dialysis'],
  hst: ['horseshoe'],
  hole: ['round-hole', 'operculated', 'macular-hole'],
  rh: ['round-hole', 'operculated'],
};

const readBreakCount: Reader = (clause, record) => {
  const all = record.breaks?.found;
  if (all === undefined) return [];
  const list = all === 'none' ? [] : all;
  return [...clause.plain.matchAll(breakCount)]
    .filter((match) => {
      const [words, how = '', what = ''] = match;
      if (/further|separate|new|flat|treated/.test(words)) return false;
      const noun = what.replace(/s$/, '');
      const kinds = kindOf[noun];
      if (kinds !== undefined && list.some(({ kind }) => kind === undefined)) return false;
      const ofKind =
        kinds === undefined ? list : list.filter(({ kind }) => kind !== undefined && kinds.includes(kind));
      const total = /horseshoe/.test(words)
        ? list.filter(({ kind }) => kind === 'horseshoe').length
        : ofKind.length;
      const after = clause.plain.slice(match.index + words.length);
      // One of several is still "one tear at 2 o'clock".
      const placed =
        /^\s*(?:at|in|near|supero|infero|was(?! (?:found|seen|identified|present)\b(?! (?:at|in)))|lay|on|st\b|sn\b|it\b)/.test(
          after,
        );
      if (how === 'no')
        return (
          list.length > 0 &&
          noun === 'break' &&
          /^\s*(?:(?:was|were|is|are) )?(?:found|seen|identified|present|visible|detected)?\s*[.,;]?\s*$/.test(
            after,
          )
        );
      if (how === 'both') return total !== 2 && list.length !== 2;
      if (how === 'multiple' || how === 'several') return total < 2;
      const counted = /single|solitary/.test(how) ? 1 : /pair|couple/.test(how) ? 2 : numberOf(how);
      return counted === 1 && placed ? false : counted !== total && !(counted < list.length && placed);
    })
    .map((match) =>
      deny(
        'count',
        clause,
        spanOf(match),
        'breaks.found',
        list.length === 1 ? '1 break' : `${list.length} breaks`,
      ),
    );
};

interface Counted {
  words: RegExp;
  values: (record: CaseRecord) => (number | undefined)[];
  field: string;
  unit: string;
}

const n = `(?<![\\w.,:/-])(${NUMBER})`;
const treatments = (record: CaseRecord) =>
  Array.isArray(record.retinopexy?.treatments) ? record.retinopexy.treatments : [];
const fixations = (record: CaseRecord, kind: string) =>
  Array.isArray(record.buckle?.elements)
    ? record.buckle.elements
        .map(({ fixation }) =>
          Array.isArray(fixation) ? fixation.filter((one) => one.kind === kind).length : 0,
        )
        .filter((count) => count > 0)
    : [];
const whole = (value: number | 'not-applicable' | undefined) =>
  typeof value === 'number' ? value : undefined;

const counted: readonly Counted[] = [
  {
    words: new RegExp(`${n}[- ]ports?\\b`, 'g'),
    values: ({ vitreous }) => [whole(vitreous?.ports)],
    field: 'vitreous.ports',
    unit: 'ports',
  },
  {
    words: new RegExp(
      `${n}[- ]quadrants? (?:(?:of )?detach|(?:was|were|are) (?:\\w+ )?detach|rr?d\\b)|(?:detachment|rr?d)(?: of| in|,|:)? (${NUMBER}) quadrants?`,
      'g',
    ),
    values: ({ before }) => [before?.quadrantsDetached],
    field: 'before.quadrantsDetached',
    unit: 'quadrants',
  },
  {
    words: new RegExp(`${n} rows?\\b`, 'g'),
    values: (record) => treatments(record).map(({ rows }) => rows),
    field: 'retinopexy.treatments',
    unit: 'rows',
  },
  {
    words: new RegExp(
      `${n} (?:laser )?(?:applications?|spots|burns|shots|freezes)\\b|\\b(?:applications|spots|burns|shots) ?[:=x] ?(${NUMBER})\\b`,
      'g',
    ),
    values: (record) => treatments(record).map(({ applications }) => applications),
    field: 'retinopexy.treatments',
    unit: 'applications',
  },
  {
    words: new RegExp(`${n} (?:rect(?:i|us muscles)|muscles)\\b`, 'g'),
    values: ({ buckle }) => [Array.isArray(buckle?.muscleSlings) ? buckle.muscleSlings.length : undefined],
    field: 'buckle.muscleSlings',
    unit: 'muscles',
  },
  {
    words: new RegExp(`${n} (?:scleral )?mattress (?:sutures|stitches)\\b`, 'g'),
    values: (record) => fixations(record, 'mattress-suture'),
    field: 'buckle.elements.0.fixation',
    unit: 'mattress sutures',
  },
  {
    words: new RegExp(`${n} (?:scleral tunnels|belt loops)\\b`, 'g'),
    values: (record) => fixations(record, 'scleral-tunnel'),
    field: 'buckle.elements.0.fixation',
    unit: 'scleral tunnels',
  },
  {
    words: new RegExp(`(?:pvr|c[pa])\\b[^.;,]{0,12}? (${NUMBER}) clock[- ]hours?\\b`, 'g'),
    values: ({ before }) => [whole(before?.pvr?.clockHours)],
    field: 'before.pvr.clockHours',
    unit: 'clock hours',
  },
  {
    words: new RegExp(
      `(?:tear|grt|dialysis)(?: of| extending| over)? (${NUMBER}) clock[- ]hours?\\b|${n} clock[- ]hour (?:giant )?(?:tear|grt|dialysis)`,
      'g',
    ),
    values: ({ breaks }) =>
      Array.isArray(breaks?.found) ? breaks.found.map(({ extentClockHours }) => extentClockHours) : [],
    field: 'breaks.found.0.extentClockHours',
    unit: 'clock hours',
  },
];

/** Numbers of breaks, ports, quadrants, rows, applications, muscles, sutures and clock hours. */
export const readCounts: Reader = (clause, record) => {
  if (clause.about !== 'this-operation') return [];
  return [
    ...readBreakCount(clause, record),
    ...counted.flatMap(({ words, values, field, unit }) => {
      const known = values(record).filter((value) => value !== undefined);
      if (known.length === 0) return [];
      return [...clause.plain.matchAll(words)]
        .filter((match) => {
          const figure = match.slice(1).find((group) => group !== undefined);
          return (
            figure !== undefined && !known.includes(numberOf(figure)) && !negatedAt(clause.plain, match.index)
          );
        })
        .map((match) => deny('count', clause, spanOf(match), field, `${known.join(', ')} ${unit}`));
    }),
  ];
};
