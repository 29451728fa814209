import type { BuckleElement, CaseRecord, Fixation } from '../../record/schema.ts';
import { deny, type Reader, spanOf } from '../finding.ts';
import { negatedAfter, negatedAt } from '../numbers.ts';

const elementsOf = (record: CaseRecord): BuckleElement[] =>
  Array.isArray(record.buckle?.elements) ? record.buckle.elements : [];

const fixationsOf = (record: CaseRecord): Fixation[] =>
  elementsOf(record).flatMap(({ fixation }) => (Array.isArray(fixation) ? fixation : []));

const closuresOf = (record: CaseRecord) =>
  elementsOf(record).flatMap(({ closure }) => (typeof closure === 'object' ? [closure] : []));

const defined = <T>(values: readonly (T | undefined)[]): T[] =>
  values.filter((value): value is T => value !== undefined);

interface Thing {
  /** What is recorded when these words are used. */
  value: string;
  words: RegExp;
}

interface Family {
  things: readonly Thing[];
  /** What is recorded; empty when nothing is, or not all of it. */
  recorded: (record: CaseRecord) => string[];
  field: string;
  /** The words between commas must speak of this. */
  within?: RegExp;
  /** The words between commas must not speak of this. */
  unless?: RegExp;
}

const sutureMaterials: readonly Thing[] = [
  { value: 'nylon', words: /\b(?:nylon|polyamide)\b/g },
  { value: 'polyester', words: /\bpolyester\b/g },
  { value: 'polypropylene', words: /\bpolypropylene\b/g },
  { value: 'polyglactin-910', words: /\bpolyglactin(?: 910)?\b/g },
  { value: 'polydioxanone', words: /\b(?:polydioxanone|pds)\b/g },
];

const conjunctiva = /\bconj(?:unctiva\w*)?\b/;

const families: readonly Family[] = [
  {
    things: sutureMaterials,
    recorded: (record) =>
      defined([
        ...fixationsOf(record).map(({ material }) => material),
        ...closuresOf(record).map(({ material }) => material),
      ]).filter((material) => material !== 'not-applicable'),
    field: 'buckle.elements.0.fixation',
    unless: /sclerotom|\bports?\b|corneal?\b|wound|\biris|traction|\bconj/,
  },
  {
    things: [
      ...sutureMaterials,
      { value: 'plain-gut', words: /\b(?:plain )?gut\b/g },
      { value: 'glue', words: /\b(?:fibrin )?glued?\b/g },
      { value: 'cautery', words: /\bcauter(?:y|ized|ised)\b/g },
    ],
    recorded: ({ buckle }) =>
      defined([buckle?.conjunctivalClosure]).filter((closure) => closure !== 'not-applicable'),
    field: 'buckle.conjunctivalClosure',
    within: new RegExp(
      `${conjunctiva.source}.*\\b(?:clos|sew|sutur|glue|gut)|\\bto conj|clos\\w+ (?:of )?(?:the )?conj`,
    ),
    unless: /\bband|sponge|fixed|mattress/,
  },
  {
    things: [
      { value: 'solid-silicone', words: /\bsolid silicone\b/g },
      { value: 'silicone-sponge', words: /\b(?:silicone )?sponge\b/g },
    ],
    recorded: (record) => {
      const elements = elementsOf(record);
      return elements.every(({ material }) => material !== undefined)
        ? elements.flatMap(({ material, form }) => [
            ...defined<string>([material]),
            ...(form?.endsWith('sponge') === true ? ['silicone-sponge'] : []),
          ])
        : [];
    },
    field: 'buckle.elements.0.material',
    unless: /weck|cellulose|merocel|surgical sponge|sponge stick|on a stick|swabs?|buds|counts?|corneal/,
  },
  {
    things: [
      { value: 'tyre', words: /\bt[yi]re\b/g },
      { value: 'strip', words: /\b(?:silicone )strip\b/g },
      { value: 'round-sponge', words: /\bround (?:silicone )?sponge\b/g },
      { value: 'oval-sponge', words: /\boval (?:silicone )?sponge\b/g },
      { value: 'wedge', words: /\bwedge\b/g },
    ],
    recorded: (record) => {
      const forms = defined(elementsOf(record).map(({ form }) => form));
      return forms.length === elementsOf(record).length ? forms : [];
    },
    field: 'buckle.elements.0.form',
  },
  {
    things: [
      { value: 'sleeve', words: /\bsleeve\b/g },
      { value: 'clip', words: /\bclip(?:ped|s)?\b/g },
      { value: 'knot', words: /\b(?:clove hitch|knot(?:ted)?|tied)\b/g },
      { value: 'suture', words: /\b(?:by|with) (?:a )?sutures?\b|\bsutured together\b/g },
    ],
    recorded: (record) => defined(closuresOf(record).map(({ kind }) => kind)),
    field: 'buckle.elements.0.closure.kind',
    within: /\b(?:ends|joined|sleeve|clip\w*)\b/,
    unless: /\b(?:drape|paper|turned|buried|throws?|traction|mattress)\b/,
  },
  {
    things: [
      { value: 'scleral-tunnel', words: /\b(?:scleral tunnels?|belt loops?|tunnels?(?= in))\b/g },
      { value: 'mattress-suture', words: /\bmattress (?:sutures?|stitch(?:es)?)\b/g },
    ],
    recorded: (record) => defined(fixationsOf(record).map(({ kind }) => kind)),
    field: 'buckle.elements.0.fixation',
    unless: /sclerotom|conj/,
  },
  {
    things: [
      { value: 'triamcinolone', words: /\btriamcinolone\b/g },
      { value: 'trypan-blue', words: /\btrypan(?: blue)?\b/g },
      { value: 'brilliant-blue', words: /\b(?:brilliant blue|bbg)\b/g },
      { value: 'indocyanine-green', words: /\b(?:indocyanine green|icg)\b/g },
    ],
    recorded: ({ vitreous }) =>
      vitreous?.dyes === 'none'
        ? ['none']
        : Array.isArray(vitreous?.dyes)
          ? defined(vitreous.dyes.map(({ kind }) => kind))
          : [],
    field: 'vitreous.dyes',
    unless: /tenon|subconj|\bmg\b|intravitreal/,
  },
];

const viscosity = /(?<![\d.,])(\d{1,2}[,. ]?\d{3}|\d{3})[ -]?(?:c(?:st|s)|centistokes?)\b/g;

const readViscosity: Reader = (clause, { tamponade }) => {
  const recorded = tamponade?.viscosityCentistokes;
  if (typeof recorded !== 'number') return [];
  return [...clause.plain.matchAll(viscosity)]
    .filter(
      (match) =>
        Number((match[1] ?? '').replace(/[,. ]/g, '')) !== recorded && !negatedAt(clause.plain, match.index),
    )
    .map((match) =>
      deny('material', clause, spanOf(match), 'tamponade.viscosityCentistokes', `${recorded} cSt`),
    );
};

/** What stands between commas around a place. */
const pieceAt = (plain: string, index: number): string => {
  const end = plain.indexOf(',', index);
  return plain.slice(plain.lastIndexOf(',', index) + 1, end < 0 ? plain.length : end);
};

/** Materials of sutures and elements, forms, closures, dyes and the viscosity of oil. */
export const readMaterials: Reader = (clause, record) => {
  const { plain } = clause;
  if (clause.about !== 'this-operation') return [];
  const found = readViscosity(clause, record);
  for (const { things, recorded, field, within, unless } of families) {
    let values: string[] | undefined;
    for (const { value, words } of things)
      for (const match of plain.matchAll(words)) {
        values ??= recorded(record);
        if (values.length === 0 || values.includes(value)) continue;
        const piece = pieceAt(plain, match.index);
        if (within?.test(piece) === false || unless?.test(piece) === true) continue;
        if (negatedAt(plain, match.index) || negatedAfter(plain, match.index + match[0].length)) continue;
        found.push(
          deny(
            'material',
            clause,
            spanOf(match),
            field,
            [...new Set(values)].join(', ').replaceAll('-', ' '),
          ),
        );
      }
  }
  return found;
};
