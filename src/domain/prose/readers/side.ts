import { deny, type Reader, spanOf } from '../finding.ts';

/** What is one of a pair: the word before it names a side, where "left in the eye" and "right angles" do not. */
const ofAnEye =
  '(?:-| )?(?:sided )?(?:upper |lower |posterior |anterior |macula[- ](?:off|on|split|involving|sparing) |rhegmatogenous |tractional |recurrent |total |subtotal |inferior |superior |giant |3-port |three-port |23|25|27|20)?-?(?:gauge )?(?:g )?(?:eye|globe|fundus|retinal?|macula|vitreous|vitrectomy|pars plana|ppv|scleral?|buckle|buckling|encircling|encirclement|pneumatic|cryo(?:therapy|pexy)?|phaco\\w*|cataract|cornea|pupil|iris|lens|orbit|conjunctiva|rd|rrd|detachment|retinopexy|gas|oil|tamponade|band|optic|disc|iol|intraocular)\\b';

const patterns: readonly { pattern: RegExp; side: (match: RegExpMatchArray) => string }[] = [
  { pattern: new RegExp(`\\b(right|left)${ofAnEye}`, 'g'), side: (match) => match[1] ?? '' },
  // "surgery to the left", "of the right": at the end of what is said, never "to the left side" or "left lateral".
  {
    pattern: /\b(?:on|in|of|to) the (right|left)(?=\s*(?:[,.;:)]|$|was|were|under|with|for|and (?:no|a)\b))/g,
    side: (match) => match[1] ?? '',
  },
  {
    pattern: /\b(re|le|od|os)\b(?![-'])/g,
    side: (match) => (match[1] === 're' || match[1] === 'od' ? 'right' : 'left'),
  },
  {
    pattern: /(?<![\w/.-])(r|l)(?: eye\b| (?:rd|rrd|ppv|vitrectomy|buckle|sb)\b)/g,
    side: (match) => (match[1] === 'r' ? 'right' : 'left'),
  },
  { pattern: /\(\s*(r|l|right|left)\s*\)/g, side: (match) => (match[1]?.startsWith('r') ? 'right' : 'left') },
  {
    pattern: /\b(?:eye|side|laterality)\s*[:=]\s*(right|left|r|l|re|le|od|os)\b/g,
    side: (match) => (/^(?:r|od)/.test(match[1] ?? '') ? 'right' : 'left'),
  },
];

const isAbbreviation = /^(?:re|le|od|os)$/;

/** Side of the operation, written out or as RE, LE, R, L, OD, OS. */
export const readSide: Reader = (clause, record) => {
  const eye = record.who?.eye;
  if (eye === undefined || clause.about === 'elsewhere') return [];
  const found = patterns.flatMap(({ pattern, side }) =>
    [...clause.plain.matchAll(pattern)]
      // Abbreviations are capitals: "re" in lower case is a word of its own.
      .filter((match) => {
        const written = clause.text.slice(match.index, match.index + match[0].length);
        return !isAbbreviation.test(match[0]) || written === written.toUpperCase();
      })
      .filter((match) => side(match) !== eye)
      .map((match) => deny('side', clause, spanOf(match), 'who.eye', `${eye} eye`)),
  );
  return found.filter(
    (one, at) =>
      !found.some((other, place) => place < at && other.start <= one.start && one.start < other.end),
  );
};
