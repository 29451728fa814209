import type { CaseRecord } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { negatedAfter, negatedAt } from '../numbers.ts';

/** Lens state before the operation or, when the operation changed it, after. */
const lensStates = (record: CaseRecord): Set<string> => {
  const lens = record.before?.lens;
  const states = new Set<string>();
  if (lens === undefined) return states;
  states.add(lens === 'cataract' ? 'phakic' : lens);
  const work = record.vitreous?.lensWork;
  const implant = record.vitreous?.lensImplant;
  const implanted = implant !== undefined && implant !== 'not-applicable';
  if (implanted) states.add('pseudophakic');
  if ((work === 'lensectomy' || work === 'implant-removed' || work === 'phacoemulsification') && !implanted) {
    states.add('aphakic');
    if (work === 'phacoemulsification') states.add('pseudophakic');
  }
  return states;
};

const lensWords = /(?<![\w-])(pseudo-?phakic|aphakic|phakic|pseudo-?phakia|aphakia)\b/g;

export const readLens: Reader = (clause, record) => {
  const states = lensStates(record);
  if (clause.about === 'elsewhere' || states.size === 0) return [];
  return [...clause.plain.matchAll(lensWords)]
    .filter((match) => {
      const state = (match[1] ?? '').replace('-', '').replace(/ia$/, 'ic');
      return negatedAt(clause.plain, match.index)
        ? states.size === 1 && states.has(state)
        : !states.has(state);
    })
    .map((match) => deny('lens', clause, spanOf(match), 'before.lens', [...states].join(', then ')));
};

const maculaWords: readonly (readonly [string, RegExp])[] = [
  [
    'on',
    /\bmacula(?:r)?(?:[- ]| is | was | remained | still )?(?:on|sparing|attached)\b|\bmac[- ]on\b|\bfovea(?:l)? (?:was |is |remained )?(?:on|attached|sparing)\b|\bmacula (?:was |is )?not (?:detached|involved)\b|\bsparing the macula\b/g,
  ],
  [
    'off',
    /\bmacula(?:r)?(?:[- ]| is | was )?(?:off|detached|involving)\b|\bmac[- ]off\b|\bfovea(?:l)? (?:was |is )?(?:off|detached)\b|\bdetached macula\b|\binvolving the macula\b/g,
  ],
  ['split', /\bmacula(?:r)?(?:[- ]| is | was )?(?:split(?:ting)?|bisected)\b|\b(?:split|bisected) macula\b/g],
];

/** What is said of the end of the operation is not what was found before it. */
const afterwards =
  /\b(?:at the end|end of (?:the )?(?:case|operation|procedure|surgery)|flat|re-?attached|post-?op(?:erative(?:ly)?)?|after (?:surgery|the operation))\b/;

export const readMacula: Reader = (clause, record) => {
  const macula = record.before?.macula;
  if (clause.about === 'elsewhere' || macula === undefined || afterwards.test(clause.plain)) return [];
  return maculaWords.flatMap(([state, words]) =>
    [...clause.plain.matchAll(words)]
      .filter((match) => {
        const negated = negatedAt(clause.plain, match.index);
        return negated ? state === macula : state !== macula;
      })
      .map((match) => deny('macula', clause, spanOf(match), 'before.macula', `macula ${macula}`)),
  );
};

interface Claim {
  words: RegExp;
  /** What is recorded: happened, did not happen, or nobody said. */
  happened: (record: CaseRecord) => boolean | undefined;
  field: string;
  recorded: (record: CaseRecord) => string;
}

const some = (list: readonly unknown[] | 'none' | undefined): boolean | undefined =>
  list === undefined ? undefined : list !== 'none' && list.length > 0;

const hasRole = (record: CaseRecord, roles: readonly string[]): boolean | undefined => {
  const elements = record.buckle?.elements;
  if (elements === undefined || elements === 'none') return elements === undefined ? undefined : false;
  if (elements.some(({ role }) => role !== undefined && roles.includes(role))) return true;
  return elements.some(({ role }) => role === undefined) ? undefined : false;
};

const hasModality = (record: CaseRecord, modalities: readonly string[]): boolean | undefined => {
  const treatments = record.retinopexy?.treatments;
  if (treatments === undefined || treatments === 'none') return treatments === undefined ? undefined : false;
  if (treatments.some(({ modality }) => modality !== undefined && modalities.includes(modality))) return true;
  return treatments.some(({ modality }) => modality === undefined) ? undefined : false;
};

const claims: readonly Claim[] = [
  {
    words:
      /\b(?:subretinal fluid (?:was|were) (?:\w+ )?drained|(?:external(?:ly)?|internal(?:ly)?|srf|fluid) drain(?:age|ed)|(?<!no )drainage(?! retinotom)(?: of (?:subretinal fluid|srf))?(?= |$|[,.;:]))/g,
    happened: ({ drainage }) => (drainage?.kind === undefined ? undefined : drainage.kind !== 'none'),
    field: 'drainage.kind',
    recorded: ({ drainage }) =>
      drainage?.kind === 'none' ? 'no drainage' : `${drainage?.kind ?? ''} drainage`,
  },
  {
    words: /\b(?:cryo(?:therapy|pexy|retinopexy)?)\b/g,
    happened: (record) => hasModality(record, ['cryo']),
    field: 'retinopexy.treatments',
    recorded: (record) => (hasModality(record, ['cryo']) === true ? 'cryotherapy' : 'no cryotherapy'),
  },
  {
    words: /\b(?:endo-?laser|laser retinopexy|lasered|laser (?:was )?applied|indirect laser)\b/g,
    happened: (record) =>
      hasModality(record, ['endolaser', 'indirect-laser', 'slit-lamp-laser', 'trans-scleral-laser']),
    field: 'retinopexy.treatments',
    recorded: (record) =>
      hasModality(record, ['endolaser', 'indirect-laser', 'slit-lamp-laser', 'trans-scleral-laser']) === true
        ? 'laser'
        : 'no laser',
  },
  {
    words: /\b(?:encircling (?:band|element|buckle)|encirclement|360(?:°| degrees?)? (?:band|buckle))\b/g,
    happened: (record) => hasRole(record, ['encircling']),
    field: 'buckle.elements',
    recorded: (record) =>
      hasRole(record, ['encircling']) === true ? 'encircling band' : 'no encircling band',
  },
  {
    words: /\b(?:scleral buckle|buckling(?! element))\b/g,
    happened: ({ buckle }) => some(buckle?.elements),
    field: 'buckle.elements',
    recorded: ({ buckle }) => (some(buckle?.elements) === true ? 'a buckle' : 'no buckle'),
  },
  {
    words: /\b(?:complications?)\b/g,
    happened: ({ endOfCase }) => some(endOfCase?.complications),
    field: 'endOfCase.complications',
    recorded: ({ endOfCase }) =>
      some(endOfCase?.complications) === true ? 'complications' : 'no complications',
  },
  {
    words: /\b(?:vitrectomy|ppv)\b/g,
    happened: ({ vitreous }) => vitreous?.vitrectomy,
    field: 'vitreous.vitrectomy',
    recorded: ({ vitreous }) => (vitreous?.vitrectomy === true ? 'vitrectomy' : 'no vitrectomy'),
  },
  {
    words: /\b(?:nitrous oxide was (?:used|given)|nitrous oxide anaesthesia)\b/g,
    happened: ({ anaesthesia }) => anaesthesia?.nitrousOxideUsed,
    field: 'anaesthesia.nitrousOxideUsed',
    recorded: ({ anaesthesia }) =>
      anaesthesia?.nitrousOxideUsed === true ? 'nitrous oxide used' : 'no nitrous oxide',
  },
  {
    words: /\b(?:specimens?)\b(?= (?:was|were|sent|taken)|$|[,.;:])/g,
    happened: ({ endOfCase }) => some(endOfCase?.specimens),
    field: 'endOfCase.specimens',
    recorded: ({ endOfCase }) => (some(endOfCase?.specimens) === true ? 'specimens' : 'no specimens'),
  },
  {
    words: /\b(?:proliferative vitreoretinopathy|pvr)\b/g,
    happened: ({ before }) => (before?.pvr?.grade === undefined ? undefined : before.pvr.grade !== 'none'),
    field: 'before.pvr.grade',
    recorded: ({ before }) => (before?.pvr?.grade === 'none' ? 'no PVR' : `PVR ${before?.pvr?.grade ?? ''}`),
  },
];

/** Only "no drainage", "without drainage", "drainage was not done" deny; a far-off "not" does not. */
const flatlyDenied = (plain: string, index: number, end: number) =>
  /\b(?:no|without(?: any)?|nil)\s+(?:(?:intra-?operative|immediate|surgical|external|internal|other|further|evidence of|signs? of|scleral|obvious|\w+ or)\s+)*$/.test(
    plain.slice(Math.max(0, index - 60), index),
  ) ||
  negatedAfter(plain, end) ||
  /\bnot (?:\w+ )?drained/.test(plain.slice(index, end + 2));

const tenseless =
  /\b(?:risks?|warning|warned|signs of|look for|watch for|symptoms|explained|future|later|plan(?:ned)?|will|return for|further|repeat)\b/;

/** What is said to have been done or not done. */
export const readDone: Reader = (clause, record) => {
  if (clause.about === 'elsewhere' || tenseless.test(clause.plain)) return [];
  const found: ProseFinding[] = [];
  for (const claim of claims) {
    const happened = claim.happened(record);
    if (happened === undefined) continue;
    for (const match of clause.plain.matchAll(claim.words)) {
      const end = match.index + match[0].length;
      const denied = flatlyDenied(clause.plain, match.index, end);
      const open = !denied && negatedAt(clause.plain, match.index);
      if (open || denied !== happened) continue;
      found.push(deny('negation', clause, spanOf(match), claim.field, claim.recorded(record)));
    }
  }
  return found;
};
