import { deny, type ProseFinding, type Reader, spanOf } from '../finding.ts';
import { NUMBER, negatedAfter, negatedAt, numberOf, sameNumber } from '../numbers.ts';

const names: readonly { agent: string; words: string }[] = [
  { agent: 'SF6', words: 'sf-?6|sulphur hexafluoride|sulfur hexafluoride' },
  { agent: 'C2F6', words: 'c2f6|hexafluoroethane|perfluoroethane' },
  { agent: 'C3F8', words: 'c3f8|octafluoropropane|perfluoropropane' },
  { agent: 'heavy-oil', words: 'heavy (?:silicone )?oil' },
  {
    agent: 'silicone-oil',
    words:
      '(?<!heavy )(?:light )?silicone oil|\\boil (?:tamponade|fill)|(?:air|fluid|pfcl|liquid|heavy liquid)[- ]oil(?: exchange)?|sio\\b|(?<=(?:\\band|\\bwith|\\bplus|[,+/:]) ?)oil(?= ?(?:[.,;+/]|$))|(?:1[,. ]?000|1[,. ]?300|5[,. ]?000) ?c(?:st|s|entistokes?)(?: oil)?',
  },
  {
    agent: 'air',
    words:
      '(?<=(?:fill|tamponade|agent): ?)air\\b|air (?:tamponade|bubble|fill|injection|injected|0\\.\\d)|(?:left|leaving|filled) (?:with|under|in) air|under air at (?:the )?end|(?:retinopexy|pneumatic) with air',
  },
];

const allNames = names.map(({ words }) => words).join('|');
const anyAgent = new RegExp(`(?<![\\w])(?:${allNames})(?![\\w-])`, 'g');
/** The lone words are known by what stands before them, which is not among them. */
const lone: Readonly<Record<string, string>> = { oil: 'silicone-oil', air: 'air' };
const agentOf = (words: string) =>
  lone[words] ?? names.find((name) => new RegExp(`^(?:${name.words})$`).test(words))?.agent;
const percentBefore = new RegExp(
  `(${NUMBER})[- ]?(?:%|per ?cent)(?: (?:of|isoexpansile|mixture of))? (?:${allNames})(?![\\w])`,
  'g',
);
const percentAfter = new RegExp(
  `(?:${allNames})(?:,| gas)?(?: at a concentration of| mix(?:ture)? of| at| of| mixture of| mixed to| to| diluted to| in a concentration of| -)? ?(?:\\((?:[a-z-]+, ?)?)?(${NUMBER})[- ]?(?:%|per ?cent)(?! (?:of|fill))`,
  'g',
);

const percentFurther = new RegExp(
  `(?:${allNames}|gas (?:concentration|mixture|mix))(?: (?!above|below|over|than|expands|fill|and|with)[a-z]+){0,4}:? (${NUMBER})[- ]?(?:%|per ?cent)(?! (?:of|fill))`,
  'g',
);

const recordedName: Readonly<Record<string, string>> = {
  none: 'no tamponade',
  air: 'air',
  'silicone-oil': 'silicone oil',
  'heavy-oil': 'heavy silicone oil',
};

/** Air is exchanged on the way, oil is taken out of old cases: those words do not name what was left in. */
const airOnTheWay = /air[- ]fluid|fluid[- ]air|exchange(?:d)? (?:for|of) air/;
const outOfTheEye = /remov(?:al|ed) of|oil[- ](?:remov|out)|ex-?oil/;

const readAgent: Reader = (clause, record) => {
  const agent = record.tamponade?.agent;
  if (agent === undefined) return [];
  const recorded = recordedName[agent] ?? agent;
  const found: ProseFinding[] = [];
  for (const match of clause.plain.matchAll(anyAgent)) {
    const named = agentOf(match[0]);
    const around = clause.plain.slice(Math.max(0, match.index - 14), match.index + match[0].length);
    if (named === undefined || (named === 'air' ? airOnTheWay : outOfTheEye).test(around)) continue;
    const negated =
      negatedAt(clause.plain, match.index) || negatedAfter(clause.plain, match.index + match[0].length);
    if (
      negated
        ? named === agent && /\b(?:no|without)\s+(?:\w+\s+)?$/.test(clause.plain.slice(0, match.index))
        : named !== agent && !(named === 'silicone-oil' && agent === 'heavy-oil')
    ) {
      found.push(deny('agent', clause, spanOf(match), 'tamponade.agent', recorded));
    }
  }
  return found;
};

const readConcentration: Reader = (clause, record) => {
  const percent = record.tamponade?.concentrationPercent;
  const agent = record.tamponade?.agent;
  if (typeof percent !== 'number' || agent === undefined) return [];
  const seen = new Set<number>();
  return [percentBefore, percentAfter, percentFurther]
    .flatMap((words) => [...clause.plain.matchAll(words)])
    .filter((match) => {
      const at = match.index + match[0].lastIndexOf(match[1] ?? '');
      const fresh = !seen.has(at);
      seen.add(at);
      return fresh && !negatedAt(clause.plain, match.index) && !sameNumber(numberOf(match[1] ?? ''), percent);
    })
    .map((match) =>
      deny('concentration', clause, spanOf(match), 'tamponade.concentrationPercent', `${percent}%`),
    );
};

const pureWords = /\b(pure|undiluted|neat|diluted)\b/g;

/** Gas said to be pure that was diluted, or the other way round. */
const readMixing: Reader = (clause, { tamponade }) => {
  const mixing = tamponade?.mixing;
  if (mixing === undefined || mixing === 'not-applicable') return [];
  if (!/\b(?:gas|sf-?6|c2f6|c3f8|hexafluor\w+|perfluoropropane|octafluoropropane)\b/.test(clause.plain))
    return [];
  return [...clause.plain.matchAll(pureWords)]
    .filter(
      (match) =>
        (match[1] === 'diluted' ? 'diluted' : 'pure') !== mixing &&
        !negatedAt(clause.plain, match.index) &&
        !/^ (?:\d|ml)|made up|diluted (?:to|with)/.test(clause.plain.slice(match.index + match[0].length)),
    )
    .map((match) => deny('concentration', clause, spanOf(match), 'tamponade.mixing', mixing));
};

const gasPutIn =
  /\b(?:(?:filled|full|left|exchanged|exchange) (?:with|of|for) gas|air[- ]gas|gas (?:tamponade|bubble|fill)|gas (?:was|were) (?:given|put in|injected|used|instilled)|(?:long|short)-acting gas)\b/g;

/** Gas without its name, in an eye that holds none. */
const readGas: Reader = (clause, { tamponade }) => {
  const agent = tamponade?.agent;
  if (agent === undefined || !(agent === 'none' || agent === 'air' || agent.endsWith('oil'))) return [];
  return [...clause.plain.matchAll(gasPutIn)]
    .filter(
      (match) => !negatedAt(clause.plain, match.index) && !(agent === 'air' && match[0].startsWith('gas')),
    )
    .map((match) => deny('agent', clause, spanOf(match), 'tamponade.agent', recordedName[agent] ?? agent));
};

const noTamponade =
  /\b(?:no|without(?: any)?) (?:gas|oil|tamponade|internal tamponade|intraocular (?:gas|tamponade))\b(?! (?:leak|bubble in|in the anterior|under|escape|was lost))/g;

const readNone: Reader = (clause, record) => {
  const agent = record.tamponade?.agent;
  if (agent === undefined || agent === 'none') return [];
  return [...clause.plain.matchAll(noTamponade)]
    .filter(
      (match) =>
        !(match[0].endsWith('oil') && !agent.endsWith('oil')) &&
        !(match[0].endsWith('gas') && agent.endsWith('oil')),
    )
    .map((match) => deny('negation', clause, spanOf(match), 'tamponade.agent', recordedName[agent] ?? agent));
};

/** Agent left in the eye and its concentration. */
export const readTamponade: Reader = (clause, record) =>
  clause.about !== 'this-operation'
    ? []
    : [
        ...readAgent(clause, record),
        ...readConcentration(clause, record),
        ...readMixing(clause, record),
        ...readGas(clause, record),
        ...readNone(clause, record),
      ];
