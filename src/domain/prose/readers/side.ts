import type { CaseRecord, Eye } from '../../record/schema.ts';
import type { Clause } from '../clause.ts';
import { deny, type ProseFinding, type Reader } from '../finding.ts';

/** What is one of a pair: the word before it names a side, where "left in the eye" and "right angles" do not. */
const ofAnEye =
  '(?:-| )?(?:sided )?(?:upper |lower |posterior |anterior |macula[- ](?:off|on|split|involving|sparing) |rhegmatogenous |tractional |recurrent |total |subtotal |inferior |superior |giant |3-port |three-port |local |facial |(?:supero|infero)-?(?:temporal|nasal) |upper |lower |bullous |shallow |primary |23|25|27|20)?-?(?:gauge )?(?:g )?(?:eye|globe|fundus|retinal?|macula|vitreous|vitrectomy|pars plana|ppv|scleral?|buckle|buckling|encircling|encirclement|pneumatic|cryo(?:therapy|pexy)?|phaco\\w*|cataract|cornea|pupil|iris|lens|orbit|conjunctiva|rr?d|detachment|retinopexy|gas|oil|tamponade|band|eb|sb|optic|disc|iol|intraocular|sub-?tenon\\S*|peribulbar|retrobulbar|block|giant|grt|dialysis|tear|break|hole|membrane|silicone|endolaser|laser|amaurosis|axial|(?:eye)?lids?)\\b';

interface SideWords {
  pattern: RegExp;
  /** Only in capitals or with a capital: in lower case the letters are other words. */
  capitals?: true;
}

const patterns: readonly SideWords[] = [
  { pattern: new RegExp(`\\b(right|left)${ofAnEye}`, 'g') },
  // "surgery to the left", "of the right": at the end of what is said, never "to the left side" or "left lateral".
  {
    pattern:
      /\b(?:on|in|of|to) the (right|left)(?=\s*(?:[,.;:)]|$|was|were|under|with|for|showed|went|is|has|and (?:no|a)\b))/g,
  },
  { pattern: /\b(re|le|od|os)\b(?![-'])/g, capitals: true },
  { pattern: /(?<![\w/.-])(rt|lt)\.?(?= |:|$)/g, capitals: true },
  {
    pattern:
      /(?<![\w/.-])(r|l)(?= eye\b| (?:\d\dg )?(?:rr?d|ppv|vitrectomy|phaco\w*|pneumatic|buckle|sb|eb|grt|cryo\w*|mp|peel|retina\w*|scleral|encircl\w*|macula\w*|dialysis)\b)/g,
    capitals: true,
  },
  { pattern: /\(\s*(r|l|right|left)\s*\)/g },
  { pattern: /\b(?:eye|side|laterality)\s*[:=]\s*(right|left|r|l|re|le|od|os)\b/g },
  { pattern: /\b(right|left)(?=[ -]sided?\b(?! down| up| for| posture))(?= ?-?sided)/g },
];

const sideOf = (words: string): Eye => (/^(?:r|od)/.test(words) ? 'right' : 'left');

interface Mention {
  index: number;
  length: number;
  side: Eye;
}

const mentionsIn = (clause: Clause): Mention[] => {
  const all = patterns.flatMap(({ pattern, capitals }) =>
    [...clause.plain.matchAll(pattern)].flatMap((match): Mention[] => {
      const written = clause.text.slice(match.index, match.index + match[0].length);
      const initial = written.charAt(0);
      if (
        capitals === true &&
        (initial !== initial.toUpperCase() ||
          (/^(?:re|le|od|os)$/.test(match[0]) && written !== written.toUpperCase()))
      )
        return [];
      return [{ index: match.index, length: match[0].trimEnd().length, side: sideOf(match[1] ?? '') }];
    }),
  );
  return all
    .filter(
      (one, at) =>
        !all.some(
          (other, place) => place < at && other.index <= one.index && one.index < other.index + other.length,
        ),
    )
    .sort((a, b) => a.index - b.index);
};

/** What is done or found in this operation; a clause with such words is not a remark on the other eye. */
const ofTheOperation =
  /\b(?:operat\w+|surgery|procedure|vitrectomy|ppv|buckl\w+|encircl\w+|band|eb|sb|pneumatic|gas|oil|sf6|c3f8|c2f6|pfcl|heavy liquid|tamponade|drained|drainage|cryo\w*|peel\w*|retinectomy|retinotomy|rr?d|grt|detach\w*|repair\w*|block|prepped|draped|marked|consent\w*|time[ -]out|anaesthe\w+|under ga|ports?|pad|shield\w*|drops?|instil|subconj\w*|sub-tenon\w*|tear|horseshoe|hst|dialysis|admitted|now|re-?attached|perfused|slung|peritomy)\b/;

/** What is said of an eye that is not operated on. */
const ofTheOther =
  /\b(?:flat|good|healthy|normal|free of|searched|lazy|amblyop\w+|lattice|scars?|old|drusen|nuclear|ns cataract|mild|no (?:new |other )?(?:break|tear|hole)s?|without (?:a )?breaks?|pvd only|va|iop|sees? well|6\/\d+|phakic|pseudophakic|aphakic|cataract|as well|too|also|prophylactic|is on|next|will|had laser|attend|symptoms?|patched|axial)\b/;

const planned = /\b(?:planned|offered|next (?:year|visit|month)|prophylactic|as well|should not)\b/;

/** "The left eye is unaffected": a state, where notes of an operation tell what was done. */
const described =
  /\b(?:right|left) eye (?:is|was|has|had|remains?|stays?|look(?:s|ed)|sees?)\b|\b(?:artificial|prosthe\w+|nothing|un(?:affected|injured|involved|remarkable)|injur\w+)\b/;

/** Whether a clause speaks of the eye that is not operated on, and so of nothing that is recorded. */
export const isOfFellowEye = (clause: Clause, record: CaseRecord): boolean => {
  const eye = record.who?.eye;
  if (eye === undefined) return false;
  const mentions = mentionsIn(clause);
  if (mentions.length === 0) return false;
  const [first] = mentions;
  const both = mentions.some(({ side }) => side === eye) && mentions.some(({ side }) => side !== eye);
  // Both eyes beside each other, as with acuities and pressures, tell of two eyes and not of a slip.
  if (both) return /\b(?:va|iop|acuity|pressures?|\d+\/\d+)\b/.test(clause.plain);
  if (first?.side === eye) return false;
  const plain = clause.plain.replace(/\bcataract (?:surgery|operation)\b/g, 'cataract');
  if (planned.test(plain)) return true;
  if (described.test(plain) && !ofTheOperation.test(plain)) return true;
  return ofTheOther.test(plain) && !ofTheOperation.test(plain.replace(/\bno (?:new |other )?tears?\b/g, ''));
};

/** Side of the operation, written out or as RE, LE, R, L, OD, OS. */
export const readSide: Reader = (clause, record): ProseFinding[] => {
  const eye = record.who?.eye;
  if (eye === undefined || clause.about !== 'this-operation') return [];
  return mentionsIn(clause)
    .filter(({ side }) => side !== eye)
    .map((mention) => deny('side', clause, mention, 'who.eye', `${eye} eye`));
};
