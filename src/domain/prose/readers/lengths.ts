import type { BuckleElement, CaseRecord } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader } from '../finding.ts';
import { FIGURE, NUMBER, negatedAt, numberOf, sameNumber } from '../numbers.ts';

const elementsOf = (record: CaseRecord): BuckleElement[] =>
  Array.isArray(record.buckle?.elements) ? record.buckle.elements : [];

const numbers = (values: readonly (number | undefined)[]): number[] =>
  values.filter((value) => value !== undefined);

const MM = '(?: ?-?mm| ?-?millimet(?:re|er)s?)\\b';
const figures = new RegExp(
  `(?<![\\d.,/\\w-])(?:(${FIGURE}) ?(?:mm)? ?(?:x|by) ?)?(${NUMBER})${MM}(?! ?hg)|\\b(?:axial length|al)\\b(?: \\w+){0,3}?[:=]? (${FIGURE})(?![\\d/%])`,
  'g',
);

const adjectives =
  '(?: (?:wide|broad|thick|solid|silicone|encircling|circumferential|grooved|round|oval|scleral|soft|segmental|radial|meridional))*';
const nouns = '(?:band|eb|strip|tyre|tire|sponge|segment|element|buckle|explant|implant|encirclement)';

interface Measure {
  before?: RegExp;
  after?: RegExp;
  values: (record: CaseRecord) => number[];
  field: string;
  unit: string;
}

/** In order: the first that fits says what was measured. */
const measures: readonly Measure[] = [
  {
    before: /\b(?:behind|posterior to) (?:the )?(?:\w+ )?insertions?(?: by|:)? $/,
    after: /^ (?:behind|posterior to|back from|from) (?:the )?(?:muscle |rectus |recti(?:'s)? )?insertions?/,
    values: (record) =>
      numbers(
        elementsOf(record).flatMap((element) =>
          element.frontEdgeReference === 'insertions'
            ? [element.frontEdgeMm, ...Object.values(element.frontEdgeByQuadrantMm ?? {})]
            : [],
        ),
      ),
    field: 'buckle.elements.0.frontEdgeMm',
    unit: 'mm behind the insertions',
  },
  {
    before: /\b(?:sclerotom(?:y|ies)|ports?|trocars?|cannulas?)(?: [\w,]+){0,4}?:? $/,
    values: ({ vitreous }) => numbers([vitreous?.sclerotomiesMm]),
    field: 'vitreous.sclerotomiesMm',
    unit: 'mm behind the limbus',
  },
  {
    before:
      /\b(?:short(?:er|en(?:ed|ing))|tighten(?:ed|ing)|taken (?:in|up)|(?:pulled|drawn) up)(?: \w+){0,3}? ?(?:by |of |to |was |: ?)?$/,
    after: /^ (?:of )?(?:shortening|tightening|shorter)/,
    values: (record) => numbers(elementsOf(record).map(({ shortenedMm }) => shortenedMm)),
    field: 'buckle.elements.0.shortenedMm',
    unit: 'mm shortened',
  },
  {
    before: /\b(?:axial length|al)\b[^.;]{0,24}$/,
    values: ({ before }) => numbers([before?.axialLengthMm]),
    field: 'before.axialLengthMm',
    unit: 'mm',
  },
  {
    before: /\bbites?(?: \w+){0,2} ?:? ?$/,
    after: /^ (?:\w+ )?bites?\b/,
    values: (record) =>
      numbers(
        elementsOf(record).flatMap(({ fixation }) =>
          Array.isArray(fixation) ? fixation.map(({ biteMm }) => biteMm) : [],
        ),
      ),
    field: 'buckle.elements.0.fixation',
    unit: 'mm bites',
  },
  {
    before: /\b(?:height|indent(?:ation)?)(?: \w+){0,4} ?:? ?$/,
    after: /^ (?:of )?(?:high|height|indent)/,
    values: (record) => numbers(elementsOf(record).map(({ heightMm }) => heightMm)),
    field: 'buckle.elements.0.heightMm',
    unit: 'mm high',
  },
];

const nounBefore = new RegExp(`\\b(${nouns})(?:,| was| of| \\()?:? ?$`);
const nounAfter = new RegExp(`^${adjectives} (${nouns})\\b`);

/** Widths and thicknesses of the elements that the noun may mean. */
const sizesOf = (record: CaseRecord, noun: string): number[] => {
  const all = elementsOf(record);
  const form = noun === 'eb' || noun === 'encirclement' ? 'band' : noun === 'tire' ? 'tyre' : noun;
  const meant = all.filter((element) => element.form?.includes(form) === true);
  return numbers(
    (meant.length > 0 ? meant : all).flatMap(({ widthMm, thicknessMm }) => [widthMm, thicknessMm]),
  );
};

const pressure = new RegExp(
  `(?:pressure|iop|tension)(?: at the end| at end| on completion)(?: \\w+){0,2}? (${FIGURE}) ?(?:mm ?hg)?`,
  'g',
);

const readPressure: Reader = (clause, { endOfCase }) => {
  const recorded = endOfCase?.pressureMmHg;
  return recorded === undefined
    ? []
    : [...clause.plain.matchAll(pressure)]
        .filter((match) => !sameNumber(numberOf(match[1] ?? ''), recorded))
        .map((match) =>
          deny(
            'length',
            clause,
            { index: match.index, length: match[0].trimEnd().length },
            'endOfCase.pressureMmHg',
            `${recorded} mmHg`,
          ),
        );
};

const gaugeWords = /\b(20|23|25|27)[- ]?(?:gauge|g)\b/g;

const readGauge: Reader = (clause, { vitreous }) => {
  const gauge = vitreous?.gauge;
  if (gauge === undefined || gauge === 'not-applicable') return [];
  return [...clause.plain.matchAll(gaugeWords)]
    .filter(
      (match) =>
        match[1] !== gauge &&
        !/^.{0,16}(?:needle|cannula|mvr|blade)/.test(clause.plain.slice(match.index + match[0].length)),
    )
    .map((match) =>
      deny(
        'length',
        clause,
        { index: match.index, length: match[0].length },
        'vitreous.gauge',
        `${gauge} gauge`,
      ),
    );
};

/** Lengths and other measured figures beside the word that says what was measured. */
export const readMeasures: Reader = (clause, record) => {
  const { plain } = clause;
  if (clause.about !== 'this-operation' || !/\d|mm|millimet/.test(plain)) return [];
  const found: ProseFinding[] = [...readPressure(clause, record), ...readGauge(clause, record)];
  for (const match of plain.matchAll(figures)) {
    const end = match.index + match[0].length;
    const [whole, first, second, axial] = match;
    if (negatedAt(plain, match.index) || /^ long\b/.test(plain.slice(end))) continue;
    if (axial !== undefined) {
      const value = record.before?.axialLengthMm;
      if (value !== undefined && !sameNumber(value, numberOf(axial)))
        found.push(
          deny(
            'length',
            clause,
            { index: match.index, length: whole.length },
            'before.axialLengthMm',
            `${value} mm`,
          ),
        );
      continue;
    }
    const before = plain.slice(Math.max(0, match.index - 48), match.index);
    const after = plain.slice(end, end + 64);
    const said = [first, second].filter((figure) => figure !== undefined).map(numberOf);
    const limbus = /^ (?:\w+ )?(?:behind|from|posterior to|post-?) ?(?:the )?limb/.test(after);
    const measure = measures.find(
      (one) => one.before?.test(before) === true || one.after?.test(after) === true,
    );
    const lead = measure?.before?.exec(before);
    const tail = measure?.after?.exec(after);
    const noun = nounAfter.exec(after) ?? nounBefore.exec(before);
    // "4 mm from the limbus": ports, when the clause is not about a break, an element or an injection.
    const ports =
      limbus && !/\b(?:tear|hole|break|dialysis|edge|band|sponge|inject|hst|retinotomy)/.test(plain);
    const [values, field, unit] =
      measure !== undefined && !(limbus && measure.field !== 'vitreous.sclerotomiesMm')
        ? [measure.values(record), measure.field, measure.unit]
        : ports
          ? [numbers([record.vitreous?.sclerotomiesMm]), 'vitreous.sclerotomiesMm', 'mm behind the limbus']
          : noun !== null && !limbus
            ? [sizesOf(record, noun[1] ?? ''), 'buckle.elements.0.widthMm', 'mm']
            : [[], '', ''];
    if (values.length === 0) continue;
    if (said.every((one) => values.some((value) => sameNumber(value, one)))) continue;
    const shown = lead !== null && lead !== undefined && measure?.field.endsWith('shortenedMm') === true;
    const start = shown ? match.index - lead[0].length : match.index;
    const stop =
      end + (tail?.[0].length ?? (measure === undefined ? (nounAfter.exec(after)?.[0].length ?? 0) : 0));
    found.push(
      deny('length', clause, { index: start, length: stop - start }, field, `${values.join(', ')} ${unit}`),
    );
  }
  return found;
};
