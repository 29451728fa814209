const words: Readonly<Record<string, number>> = {
  one: 1,
  two: 2,
  three: 3,
  four: 4,
  five: 5,
  six: 6,
  seven: 7,
  eight: 8,
  nine: 9,
  ten: 10,
  eleven: 11,
  twelve: 12,
  thirteen: 13,
  fourteen: 14,
  fifteen: 15,
  sixteen: 16,
  eighteen: 18,
  twenty: 20,
  thirty: 30,
  forty: 40,
  fifty: 50,
  sixty: 60,
};

/** Pattern of a number in figures, decimal point or comma. */
export const FIGURE = String.raw`\d+(?:[.,]\d+)?`;

/** Pattern of a number in figures or, the usual ones, in words. */
export const NUMBER = `(?:${FIGURE}|${Object.keys(words).reverse().join('|')})`;

/** Value of what `NUMBER` matches. */
export const numberOf = (written: string): number => words[written] ?? Number(written.replace(',', '.'));

/** Equal as written: 5 and 5.0 are, 5 and 5.5 are not. */
export const sameNumber = (a: number, b: number): boolean => Math.abs(a - b) < 0.005;

/** Whether a negation governs what stands at this place of a clause. */
export const negatedAt = (plain: string, index: number): boolean =>
  /\b(?:no|not|never|without|nor|neither|none|avoid(?:ed|ing)?|rather than|instead of|declined|omitted|free of|absence of|ruled out|excluded?)\b(?:[\s,]+[\w'-]+){0,5}[\s(]*$/.test(
    plain.slice(Math.max(0, index - 60), index),
  );

/** Whether the words right after a place negate it: "drainage was not performed", "buckle: none". */
export const negatedAfter = (plain: string, end: number): boolean =>
  /^(?:\s+[\w-]+){0,2}?(?:\s+(?:was|were|is|are|has been|had been))?\s*(?:not (?:been )?(?:\w+)|none|absent|unnecessary|omitted|avoided|deferred|nil)\b|^\s*[:-]\s*(?:none|no|nil)\b/.test(
    plain.slice(end, end + 60),
  );
