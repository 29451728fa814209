import { deny, type Reader, spanOf } from '../finding.ts';
import { negatedAt } from '../numbers.ts';

const centre = '(?:macula(?:r)?|mac|fovea(?:l)?)';
const links =
  '(?:(?:is|was|had|has|been|still|already|come|remain(?:s|ed)|wholly|completely|fully|just|now|the|rd|status)[: ]+)*';

/** Group 1, when it stands, turns the meaning round. */
const words: readonly (readonly ['on' | 'off' | 'split', RegExp])[] = [
  [
    'on',
    new RegExp(
      `\\b${centre}[-: ]+${links}(not |never )?(?:on|sparing|spared|attached|uninvolved)\\b|\\b(?:sparing|spared) the ${centre}\\b|\\b${centre} ${links}(?:not|never) (?:off|detached|involved)\\b|\\b(?:not|never) (?:yet )?(?:reached|involved) the ${centre}\\b`,
      'g',
    ),
  ],
  [
    'off',
    new RegExp(
      `\\b${centre}[-: ]+${links}(?:off|detached|detachment|involved|involving|came off)\\b|\\bdetached ${centre}\\b|\\b(?:involv(?:ed|ing|es)|reached|reaching) the ${centre}\\b`,
      'g',
    ),
  ],
  [
    'split',
    new RegExp(
      `\\b${centre}[-: ]+${links}(?:split(?:ting)?|bisected)\\b|\\b(?:split|bisected) ${centre}\\b`,
      'g',
    ),
  ],
];

/** What is said of the end of the operation, or of what is feared, is not what was found before it. */
const otherTime =
  /\b(?:at the end|end of (?:the )?(?:case|operation|procedure|surgery)|flat|re-?attached|post-?op(?:erative(?:ly)?)?|after (?:surgery|the operation)|so that|before (?:it|the macula) (?:came|comes|could)|threat\w*|risk|signs of|stays)\b/;

/** Macula on, off or split before the operation. */
export const readMacula: Reader = (clause, record) => {
  const macula = record.before?.macula;
  if (clause.about !== 'this-operation' || macula === undefined || otherTime.test(clause.plain)) return [];
  return words.flatMap(([state, pattern]) =>
    [...clause.plain.matchAll(pattern)]
      .filter((match) => {
        const inside = /\b(?:not|never)\b/.test(match[0]);
        const negated = inside ? match[1] !== undefined : negatedAt(clause.plain, match.index);
        return negated ? state === macula : state !== macula;
      })
      .map((match) => deny('macula', clause, spanOf(match), 'before.macula', `macula ${macula}`)),
  );
};
