import type { BuckleElement, CaseRecord, Fixation } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { FIGURE, NUMBER, negatedAt, numberOf, sameNumber } from '../numbers.ts';

const MM = '(?: ?-?mm| ?-?millimet(?:re|er)s?)\\b';

const elementsOf = (record: CaseRecord): BuckleElement[] =>
  Array.isArray(record.buckle?.elements) ? record.buckle.elements : [];

const known = (values: readonly (number | undefined)[]): number[] =>
  values.every((value) => value !== undefined) ? (values as number[]) : [];

interface Measure {
  /** First group: the figure. */
  words: RegExp;
  /** Every value that may be meant; empty when not known. */
  values: (record: CaseRecord) => number[];
  field: string;
  unit: string;
}

const elementWord = '(?:band|strip|tyre|tire|sponge|segment|element|buckle|explant|implant|silicone)';

const measures: readonly Measure[] = [
  {
    words: new RegExp(
      `(${NUMBER})${MM} of shortening|shorten(?:ed|ing)(?: \\w+){0,3}? (?:by|of|to|was|:)?\\s*(${NUMBER})${MM}|tightened by (${NUMBER})${MM}`,
      'g',
    ),
    values: (record) =>
      known(
        elementsOf(record)
          .map(({ shortenedMm }) => shortenedMm)
          .filter((mm) => mm !== undefined),
      ),
    field: 'buckle.elements.0.shortenedMm',
    unit: 'mm',
  },
  {
    words: new RegExp(
      `(${NUMBER})${MM} (?:behind|posterior to) (?:the )?(?:muscle |rectus |recti(?:'s)? )?insertions?`,
      'g',
    ),
    values: (record) =>
      known(
        elementsOf(record).flatMap((element) =>
          element.frontEdgeReference === 'insertions'
            ? [element.frontEdgeMm, ...Object.values(element.frontEdgeByQuadrantMm ?? {})]
            : element.frontEdgeReference === undefined
              ? [undefined]
              : [],
        ),
      ),
    field: 'buckle.elements.0.frontEdgeMm',
    unit: 'mm behind the insertions',
  },
  {
    words: new RegExp(
      `sclerotom(?:y|ies)(?: \\w+){0,4}? (${NUMBER})${MM}|ports?(?: \\w+){0,4}? (${NUMBER})${MM} (?:behind|from|posterior)`,
      'g',
    ),
    values: ({ vitreous }) => known([vitreous?.sclerotomiesMm]),
    field: 'vitreous.sclerotomiesMm',
    unit: 'mm behind the limbus',
  },
  {
    words: new RegExp(`axial length(?: \\w+){0,3}?[:=]? (${FIGURE})(?:${MM})?`, 'g'),
    values: ({ before }) => known([before?.axialLengthMm]),
    field: 'before.axialLengthMm',
    unit: 'mm',
  },
  {
    words: new RegExp(
      `(?<![\\d.,x])(?<![\\dx] )(${FIGURE})${MM}(?: wide| broad)? (?:(?:solid|silicone|encircling|circumferential|grooved|round|oval|scleral|soft|segmental|radial|meridional) )*${elementWord}\\b`,
      'g',
    ),
    values: (record) => known(elementsOf(record).map(({ widthMm }) => widthMm)),
    field: 'buckle.elements.0.widthMm',
    unit: 'mm wide',
  },
  {
    words: new RegExp(
      `(${FIGURE}) ?(?:mm)? ?x ?${FIGURE}${MM} (?:(?:solid|silicone|encircling|circumferential|grooved|round|oval|scleral|soft|segmental|radial|meridional) )*${elementWord}\\b`,
      'g',
    ),
    values: (record) => known(elementsOf(record).map(({ widthMm }) => widthMm)),
    field: 'buckle.elements.0.widthMm',
    unit: 'mm wide',
  },
  {
    words: new RegExp(
      `${FIGURE} ?(?:mm)? ?x ?(${FIGURE})${MM} (?:(?:solid|silicone|encircling|circumferential|grooved|round|oval|scleral|soft|segmental|radial|meridional) )*${elementWord}\\b`,
      'g',
    ),
    values: (record) =>
      known(
        elementsOf(record).flatMap(({ thicknessMm, widthMm }) =>
          thicknessMm === undefined ? [widthMm] : [thicknessMm, ...(widthMm === undefined ? [] : [widthMm])],
        ),
      ),
    field: 'buckle.elements.0.thicknessMm',
    unit: 'mm thick',
  },
  {
    words: new RegExp(
      `(?:pressure|iop|tension)(?: at the end| at end| on completion)(?: \\w+){0,2}? (${FIGURE}) ?(?:mm ?hg)?`,
      'g',
    ),
    values: ({ endOfCase }) => known([endOfCase?.pressureMmHg]),
    field: 'endOfCase.pressureMmHg',
    unit: 'mmHg',
  },
];

const gaugeWords = /\b(20|23|25|27)[- ]?(?:gauge|g)\b/g;

const readGauge: Reader = (clause, { vitreous }) => {
  const gauge = vitreous?.gauge;
  if (gauge === undefined || gauge === 'not-applicable') return [];
  return [...clause.plain.matchAll(gaugeWords)]
    .filter(
      (match) =>
        match[1] !== gauge &&
        !/needle|cannula|mvr|blade/.test(clause.plain.slice(match.index, match.index + 24)),
    )
    .map((match) => deny('length', clause, spanOf(match), 'vitreous.gauge', `${gauge} gauge`));
};

/** Lengths and other measured figures beside the word that says what was measured. */
export const readMeasures: Reader = (clause, record) => {
  if (clause.about === 'elsewhere') return [];
  const found: ProseFinding[] = readGauge(clause, record);
  for (const measure of measures) {
    const values = measure.values(record);
    if (values.length === 0) continue;
    for (const match of clause.plain.matchAll(measure.words)) {
      const figure = match.slice(1).find((group) => group !== undefined);
      if (figure === undefined || values.some((value) => sameNumber(value, numberOf(figure)))) continue;
      found.push(
        deny('length', clause, spanOf(match), measure.field, `${values.join(', ')} ${measure.unit}`),
      );
    }
  }
  return found;
};

const breakCount = new RegExp(
  `\\b(${NUMBER}|a (?:single|solitary)|single|multiple|several|both|no) (?:(?:retinal|small|large|horseshoe|round|atrophic|operculated|peripheral|further|separate|treated|flat) )*(tears?|holes?|breaks?)\\b`,
  'g',
);
const portCount = new RegExp(`\\b(${NUMBER})[- ]ports?\\b`, 'g');

const kindOf: Readonly<Record<string, readonly string[]>> = {
  tear: ['horseshoe', 'giant-tear', 'dialysis'],
  hole: ['round-hole', 'operculated', 'macular-hole'],
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
      // One of several is still "one tear at 2 o'clock".
      const placed = /^\s*(?:at|in|near|supero|infero|was|lay|on)/.test(
        clause.plain.slice(match.index + words.length),
      );
      if (how === 'no')
        return (
          list.length > 0 &&
          noun === 'break' &&
          /^\s*(?:(?:was|were|is|are) )?(?:found|seen|identified|present|visible|detected)?\s*[.,;]?\s*$/.test(
            clause.plain.slice(match.index + words.length),
          )
        );
      if (how === 'both') return total !== 2 && list.length !== 2;
      if (how === 'multiple' || how === 'several') return total < 2;
      const counted = /single|solitary/.test(how) ? 1 : numberOf(how);
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

const readPorts: Reader = (clause, { vitreous }) => {
  const ports = vitreous?.ports;
  if (typeof ports !== 'number') return [];
  return [...clause.plain.matchAll(portCount)]
    .filter((match) => numberOf(match[1] ?? '') !== ports)
    .map((match) => deny('count', clause, spanOf(match), 'vitreous.ports', `${ports} ports`));
};

/** Numbers of breaks and ports. */
export const readCounts: Reader = (clause, record) =>
  clause.about === 'elsewhere' ? [] : [...readBreakCount(clause, record), ...readPorts(clause, record)];

const sutures: readonly (readonly [string, string])[] = [
  ['nylon', 'nylon'],
  ['polyester', 'polyester'],
  ['polypropylene', 'polypropylene'],
  ['polyglactin-910', 'polyglactin(?: 910)?'],
  ['polydioxanone', 'polydioxanone|pds'],
];
const sutureWords = new RegExp(`\\b(?:${sutures.map(([, words]) => words).join('|')})\\b`, 'g');
const materialOf = (words: string) =>
  sutures.find(([, pattern]) => new RegExp(`^(?:${pattern})$`).test(words))?.[0];

const fixationsOf = (element: BuckleElement): Fixation[] =>
  Array.isArray(element.fixation) ? element.fixation : [];

const suturesRecorded = (record: CaseRecord): string[] => {
  const materials = elementsOf(record).flatMap((element) => [
    ...fixationsOf(element).map(({ material }) => material),
    typeof element.closure === 'object' ? element.closure.material : undefined,
  ]);
  return [...materials, record.buckle?.conjunctivalClosure].filter(
    (material): material is NonNullable<typeof material> =>
      material !== undefined && material !== 'not-applicable',
  );
};

const elementMaterials: readonly (readonly [string, RegExp])[] = [
  ['solid-silicone', /\bsolid silicone\b/g],
  ['silicone-sponge', /\b(?:silicone )?sponge\b/g],
];

/** Suture materials and what an element is made of. */
export const readMaterials: Reader = (clause, record) => {
  if (clause.about === 'elsewhere') return [];
  const recorded = suturesRecorded(record);
  const found: ProseFinding[] = [];
  if (recorded.length > 0) {
    for (const match of clause.plain.matchAll(sutureWords)) {
      const material = materialOf(match[0]);
      const elsewhereInTheEye = /sclerotom|port|cornea|wound|iris|traction/.test(clause.plain);
      if (
        material === undefined ||
        recorded.includes(material) ||
        elsewhereInTheEye ||
        negatedAt(clause.plain, match.index)
      )
        continue;
      found.push(
        deny(
          'material',
          clause,
          spanOf(match),
          'buckle.elements.0.fixation',
          [...new Set(recorded)].join(', '),
        ),
      );
    }
  }
  const materials = elementsOf(record).flatMap(({ material, form }) => [
    ...(material === undefined ? [] : [material as string]),
    ...(form?.endsWith('sponge') ? ['silicone-sponge'] : []),
  ]);
  if (materials.length > 0 && elementsOf(record).every(({ material }) => material !== undefined)) {
    for (const [material, words] of elementMaterials) {
      if (materials.includes(material)) continue;
      for (const match of clause.plain.matchAll(words)) {
        if (
          /weck|cellulose|surgical sponge|swab|counts?/.test(clause.plain) ||
          negatedAt(clause.plain, match.index)
        )
          continue;
        found.push(
          deny(
            'material',
            clause,
            spanOf(match),
            'buckle.elements.0.material',
            [...new Set(materials)].join(', '),
          ),
        );
      }
    }
  }
  return found;
};
