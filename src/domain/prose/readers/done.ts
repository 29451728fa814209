import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { negatedAfter, negatedAt } from '../numbers.ts';
import { claims } from './claims.ts';

/** Only "no drainage", "without drainage", "drainage was not done" deny; a far-off "not" does not. */
const denialBefore =
  /\b(?:no|not(?: been)?|without(?: any)?|nil)\s+(?:(?:intra-?operative|immediate|surgical|external|internal|other|further|evidence of|signs? of|scleral|obvious|need for|\w+ or)\s+)*$/;

/** From the words to what turns them round: "was not performed". */
const denialBehind =
  /^.{0,40}?\b(?:not(?: been)? \w+|not|none|unnecessary|omitted|avoided|deferred|nil|no)\b/;

/** Words of the match, of what stands before and behind it, that turn it round. */
const denialOf = (plain: string, index: number, end: number): { start: number; end: number } | undefined => {
  const from = Math.max(0, index - 60);
  const before = denialBefore.exec(plain.slice(from, index));
  if (before !== null) return { start: from + before.index, end };
  if (/\bnot\b/.test(plain.slice(index, end))) return { start: index, end };
  if (negatedAfter(plain, end)) {
    const turned = denialBehind.exec(plain.slice(end));
    return { start: index, end: end + (turned?.[0].length ?? 0) };
  }
  return undefined;
};

const tenseless =
  /\b(?:risks?|warning|warned|signs of|look for|watch for|symptoms|explained|future|later|plan(?:ned)?|will|return for|further|repeat)\b/;

/** "No need for", "no doubt", "no difficulty", "no sign of … in": neither done nor not done. */
const idle = /\bno (?:doubt|difficulty|twist)\b|\bnot only\b|\bwas added (?:only )?if\b/;

/** What is said to have been done or found, or not. */
export const readDone: Reader = (clause, record) => {
  const { plain } = clause;
  if (clause.about !== 'this-operation' || tenseless.test(plain) || idle.test(plain)) return [];
  const found: ProseFinding[] = [];
  for (const claim of claims) {
    let happened: boolean | undefined | 'unread' = 'unread';
    for (const match of plain.matchAll(claim.words)) {
      if (happened === 'unread') happened = claim.happened(record);
      if (happened === undefined || claim.unless?.test(plain) === true) break;
      const end = match.index + match[0].length;
      const denial = denialOf(plain, match.index, end);
      const open = denial === undefined && negatedAt(plain, match.index);
      const said = (denial === undefined) !== (claim.negative === true);
      if (open || said === happened) continue;
      const place =
        denial === undefined || denial.end <= end
          ? spanOf(match)
          : { index: match.index, length: denial.end - match.index };
      found.push(deny('negation', clause, place, claim.field, claim.recorded(record)));
    }
  }
  // One set of words denied in two ways is marked once.
  found.sort((a, b) => a.start - b.start);
  return found.filter(
    (one, at) => !found.some((other, place) => place < at && other.start < one.end && one.start < other.end),
  );
};
