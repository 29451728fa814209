import type { CaseRecord } from '../../record/schema.ts';
import { deny, type Reader, spanOf } from '../finding.ts';
import { negatedAt } from '../numbers.ts';

const posturing =
  '(?:lie|lying|lay|lies|postur\\w*|position\\w*|stay|staying|keep|keeping|sleep|nurse|nursed|rest)';
const onSide = (side: string, letter: string) =>
  new RegExp(
    `\\b(?:${side}[- ]side(?:d)?[- ]?down|(?:on|onto|to) (?:(?:his|her|their|your|the) )?${side}(?: side|(?=[.,;]|$))(?! of)|${side} lateral(?: position| decubitus)?|${posturing}[: ]+(?:\\w+ ){0,3}?(?:${side}|${letter}) side|(?:${side}|${letter}) side(?: down| posture| for \\w+ (?:days|nights|weeks)|, ?\\d)|(?<=^\\s*)(?:${side}|${letter}) side(?= ?[\\d,.]|$))`,
    'g',
  );

const words: readonly (readonly [string, RegExp])[] = [
  [
    'face-down',
    /\bface[- ]?down\b|\bprone\b|\bnose down\b|\bfd (?:posture|position)\w*|\bon (?:his|her|their|your|the) front\b/g,
  ],
  [
    'upright',
    /\b(?:sit(?:ting)? |head |bolt |keep |stay |posture:? |be )?upright\b(?! (?:piano|in november))|\bsit(?:ting)? up\b|\bhead up\b(?! ?\d| tilt)/g,
  ],
  ['right-side', onSide('right', 'r')],
  ['left-side', onSide('left', 'l')],
  ['right-cheek', /\bright cheek(?:[- ]down| to (?:the )?pillow)?\b/g],
  ['left-cheek', /\bleft cheek(?:[- ]down| to (?:the )?pillow)?\b/g],
  [
    'supine',
    /\bflat on (?:his|her|their|your|the) back\b|\bon (?:his|her|their|your|the) back\b|\bsupine\b/g,
  ],
];

/** Positions on the table and head positions in an examination are not aftercare. */
const notAftercare =
  /\b(?:on the table|under the drapes|draped?|positioned for|during (?:the )?(?:operation|surgery|exchange)|(?:for|in) (?:the )?(?:operation|surgery|injection|block|anaesthe\w+)|examin\w*|slit lamp|dressing|sat|anaesthe\w*|block|transferred|tray|piano|was seen|likes|as (?:he|she|they|you) (?:likes?|wish\w*)|postured)\b/;

const none =
  /\b(?:no (?:particular |special |specific )?(?:postur(?:e|ing)|positioning)|need not posture|posture (?:is |was )?not (?:needed|required|necessary)|free position|no position needed|(?:in )?any position|any posture)\b/g;

const positionsOf = (record: CaseRecord): string[] | undefined => {
  const posture = record.aftercare?.posture;
  if (posture === undefined) return undefined;
  if (posture === 'none') return [];
  const positions = posture.flatMap(({ position }) => (position === undefined ? [] : [position as string]));
  return positions.length < posture.length || positions.includes('free') ? undefined : positions;
};

/** Positions of aftercare, and "no posture". */
export const readPosture: Reader = (clause, record) => {
  if (clause.about !== 'this-operation' || notAftercare.test(clause.plain)) return [];
  const positions = positionsOf(record);
  if (positions === undefined) return [];
  const recorded = positions.length === 0 ? 'no posture' : positions.join(', ').replaceAll('-', ' ');
  const found = words.flatMap(([position, pattern]) =>
    [...clause.plain.matchAll(pattern)]
      .filter((match) => {
        const is =
          positions.some((one) => one.startsWith(position)) ||
          (position === 'face-down' && positions.some((one) => one.endsWith('cheek')));
        return negatedAt(clause.plain, match.index)
          ? positions.length === 1 && positions[0] === position
          : !is;
      })
      .map((match) => deny('posture', clause, spanOf(match), 'aftercare.posture', recorded)),
  );
  const denied =
    positions.length === 0
      ? []
      : [...clause.plain.matchAll(none)].map((match) =>
          deny('posture', clause, spanOf(match), 'aftercare.posture', recorded),
        );
  return [...found, ...denied];
};
