/** A stretch of text that says one thing, and where it stands in the whole. */
export interface Clause {
  text: string;
  /** The same in lower case, typographic signs made plain, of the same length. */
  plain: string;
  start: number;
  /** What it is about, when that is not this operation on this eye. */
  about: 'this-operation' | 'history' | 'elsewhere';
}

const plainSigns: Readonly<Record<string, string>> = {
  '’': "'",
  '‘': "'",
  '“': '"',
  '”': '"',
  '–': '-',
  '−': '-',
  '‑': '-',
  '\u00a0': ' ',
  '\u202f': ' ',
  '×': 'x',
  '₃': '3',
  '₆': '6',
  '₂': '2',
  '₈': '8',
};
const anySign = new RegExp(`[${Object.keys(plainSigns).join('')}]`, 'g');

/** Lower case with plain signs; every character keeps its place, so that offsets stay true. */
export const plainText = (text: string): string => {
  const lower = text.toLowerCase();
  // A few capitals of other languages grow when made small; then each is made small by itself or left.
  const same =
    lower.length === text.length
      ? lower
      : Array.from(text, (sign) => {
          const small = sign.toLowerCase();
          return small.length === sign.length ? small : sign;
        }).join('');
  return same.replace(anySign, (sign) => plainSigns[sign] ?? sign);
};

/** A full stop inside a number, an abbreviation or an initial ends nothing. */
const boundary =
  /(?<!\b(?:approx|dr|mr|mrs|ms|prof|no|vs|e\.g|i\.e|d\.o\.b|ca|st))[.!?](?=\s|$)|[;\n]|,? (?=but |whereas |although |though )|, (?=while |which )/g;

/** Words that move a clause to the other eye, a wish, a condition, a general remark or somebody else's mouth. */
const elsewhere: readonly RegExp[] = [
  /\b(?:fellow|contralateral|other|opposite|second|unoperated|better|good|only)(?: (?:right|left))? eye\b|\bfellow\b/,
  /\b(?:both eyes|either eye|each eye|bilateral(?:ly)?)\b/,
  /\b(?:if|unless|should (?:the|it|there|any|he|she|they|a|pressure|re|cataract)|were the|had the|in case|in the event|would|could|might|may(?! (?:19|20)\d\d)|risk of|possib(?:le|ly|ility)|in theory|otherwise)\b/,
  /\b(?:consider(?:ed|ing)?|discussed|option|alternative|rather than|instead of|as opposed to|planned (?:but|initially)|initially planned|original plan|was planned|had planned|intended|thought (?:too|about)|at hand|out of stock|not available|kept for|offered|trolley|put back)\b/,
  /\b(?:often|usually|(?:is|are) (?:the )?usual|generally|in general|tends? to|gives?|more likely|can (?:follow|stay)|known risk|formation)\b/,
  /\b(?:planned|scheduled|listed) (?:for|elsewhere)|\b(?:will|to) be (?:needed|considered|required|tried|thought)\b|\bthereafter\b|\bwe may\b/,
  /\b(?:referral|letter|referrer|referred|optometrist|patient|she|he|they) (?:\w+ )?(?:states?|said|says|reported|reports|described|describes|wrote|thought|mentioned|believed|suggested)\b/,
  /\b(?:according to|quoted?|reportedly|labelled|literature|textbook|studies|published|guidelines?|told (?:of|about)|heard of)\b/,
];

/** Words that move a clause to an earlier time. */
const earlier =
  /\b(?:previous(?:ly)?|prior|(?<!half )past|historic(?:al(?:ly)?)?|formerly|earlier|ago|history|had (?:undergone|had)|since childhood|years? before|last (?:year|month|time)|first operation|after (?:her|his|the|their) (?:\w+ )?(?:cataract|macular hole|first|previous) |in (?:(?:january|february|march|april|may|june|july|august|september|october|november|december) )?(?:19|20)\d\d|in (?:january|february|march|april|may|june|july|august|september|october|november|december)\b|family|(?:her|his) (?:mother|father|brother|sister|son|daughter))\b/;

/** What the words of a clause are about. */
export const aboutOf = (plain: string): Clause['about'] =>
  elsewhere.some((words) => words.test(plain))
    ? 'elsewhere'
    : earlier.test(plain)
      ? 'history'
      : 'this-operation';

const quoted = /"[^"]*"/g;

/** Splits text into clauses, without what they are about. What stands in quotation marks belongs to whoever said it. */
export const piecesOf = (text: string): Omit<Clause, 'about'>[] => {
  const plain = plainText(text).replace(quoted, (words) => ' '.repeat(words.length));
  const pieces: Omit<Clause, 'about'>[] = [];
  let start = 0;
  const add = (end: number) => {
    const piece = plain.slice(start, end);
    if (piece.trim() !== '') pieces.push({ text: text.slice(start, end), plain: piece, start });
    start = end;
  };
  for (const match of plain.matchAll(boundary)) add(match.index + match[0].length);
  add(plain.length);
  return pieces;
};
