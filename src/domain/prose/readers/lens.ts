import type { CaseRecord } from '../../record/schema.ts';
import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { FIGURE, negatedAfter, negatedAt, numberOf, sameNumber } from '../numbers.ts';

/** Lens state before the operation or, when the operation changed it, after. */
const lensStates = (record: CaseRecord, time: 'before' | 'any'): Set<string> => {
  const lens = record.before?.lens;
  const states = new Set<string>();
  if (lens === undefined) return states;
  states.add(lens === 'cataract' ? 'phakic' : lens);
  if (time === 'before') return states;
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

const stateWords =
  /(?<![\w-])(pseudo-?phak(?:ic|ia|es?)|aphak(?:ic|ia|es?)|phakic|natural lens|crystalline lens|clear lens|lens (?:is|was) clear|pc ?iol|iol|lens implant|intraocular lens)\b/g;

const stateOf = (words: string) =>
  words.startsWith('pseudo') || /iol|implant|intraocular/.test(words)
    ? 'pseudophakic'
    : words.startsWith('aphak')
      ? 'aphakic'
      : 'phakic';

const beforehand = /\b(?:before (?:surgery|the operation)|pre-?op\w*|presented|at presentation)\b/;
const toCome = /\b(?:later|secondary|second operation|in \w+ months|listed|wears?|contact)\b/;

const readState: Reader = (clause, record) => {
  const states = lensStates(record, beforehand.test(clause.plain) ? 'before' : 'any');
  if (states.size === 0) return [];
  const recorded = [...states].join(', then ');
  return [...clause.plain.matchAll(stateWords)]
    .filter((match) => {
      const state = stateOf(match[0]);
      const end = match.index + match[0].length;
      const negated = negatedAt(clause.plain, match.index) || negatedAfter(clause.plain, end);
      // "no implant was used" of an eye that has one is for the steps, not for the state.
      if (negated) return /phak/.test(match[0]) && states.size === 1 && states.has(state);
      return !states.has(state);
    })
    .map((match) => deny('lens', clause, spanOf(match), 'before.lens', recorded));
};

const cataractWords = /\bcataracts?\b(?! (?:surgery|extraction|operation|will|may|removed))/g;
const clearWords = /\b(?:(?:natural |crystalline )?lens (?:is|was) (?:quite )?clear|clear lens)\b/g;

/** A cataract or a clear lens where the record has another. */
const readClarity: Reader = (clause, record) => {
  const lens = record.before?.lens;
  if (lens === undefined) return [];
  const recorded = lens === 'cataract' ? 'phakic, cataract' : lens === 'phakic' ? 'phakic, clear' : lens;
  const words = lens === 'cataract' ? clearWords : cataractWords;
  return [...clause.plain.matchAll(words)]
    .filter(
      (match) => !negatedAt(clause.plain, match.index) && !/\b(?:after|develop\w*)\b/.test(clause.plain),
    )
    .map((match) => deny('lens', clause, spanOf(match), 'before.lens', recorded));
};

const workWords: readonly (readonly [string, RegExp])[] = [
  ['phacoemulsification', /\bphaco(?:emulsification|vitrectomy)?\b/g],
  ['lensectomy', /\blensectomy\b/g],
  ['none', /\blens (?:was |is )?(?:spared|left (?:alone|in place|untouched)|not touched|untouched)\b/g],
];

const readWork: Reader = (clause, record) => {
  const work = record.vitreous?.lensWork;
  if (work === undefined) return [];
  return workWords.flatMap(([value, words]) =>
    [...clause.plain.matchAll(words)]
      .filter((match) => {
        const negated =
          value !== 'none' &&
          (negatedAt(clause.plain, match.index) || negatedAfter(clause.plain, match.index + match[0].length));
        return negated ? work === value : work !== value;
      })
      .map((match) =>
        deny(
          'lens',
          clause,
          spanOf(match),
          'vitreous.lensWork',
          work === 'none' ? 'lens not touched' : work.replaceAll('-', ' '),
        ),
      ),
  );
};

const positions: readonly (readonly [string, RegExp])[] = [
  ['bag', /\bin the (?:capsular )?bag\b/g],
  ['sulcus', /\b(?:in(?:to)? the (?:ciliary )?|ciliary )?sulcus\b/g],
  ['anterior-chamber', /\b(?:ac ?iol|anterior chamber (?:lens|iol|implant))\b/g],
  ['scleral', /\bscleral(?:ly)?[- ]fix\w+ (?:lens|iol|implant)\b/g],
];
const power = new RegExp(
  `(?:iol|implant|lens|acrylic|power)[^.;]{0,24}?\\b(${FIGURE}) ?d(?:ioptres?)?\\b|(${FIGURE}) ?d(?:ioptres?)? (?:\\S+ ){0,2}(?:iol|implant|acrylic)`,
  'g',
);

const readImplant: Reader = (clause, record) => {
  const implant = record.vitreous?.lensImplant;
  if (implant === undefined || implant === 'not-applicable') return [];
  const found: ProseFinding[] = [];
  const { position, powerDioptres } = implant;
  if (position !== undefined)
    for (const [value, words] of positions)
      for (const match of clause.plain.matchAll(words))
        if (value !== position && !negatedAt(clause.plain, match.index))
          found.push(deny('lens', clause, spanOf(match), 'vitreous.lensImplant.position', position));
  if (powerDioptres !== undefined)
    for (const match of clause.plain.matchAll(power)) {
      const figure = match[1] ?? match[2] ?? '';
      if (!sameNumber(numberOf(figure), powerDioptres))
        found.push(
          deny('lens', clause, spanOf(match), 'vitreous.lensImplant.powerDioptres', `${powerDioptres} D`),
        );
    }
  return found;
};

/** Lens state, what was done to the lens, and the implant. */
export const readLens: Reader = (clause, record) => {
  if (clause.about !== 'this-operation' || toCome.test(clause.plain)) return [];
  const found = [readState, readClarity, readWork, readImplant].flatMap((read) => read(clause, record));
  return found.filter(
    (one, at) => !found.some((other, place) => place < at && other.start < one.end && one.start < other.end),
  );
};
