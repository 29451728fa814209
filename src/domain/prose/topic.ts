/** What a stretch of words speaks of, and the words by which it is known; each pattern is global. */
export type Topics<T extends string> = readonly (readonly [T, RegExp])[];

/** The last topic named before an offset of a clause, with the distance to it. */
export const topicBefore = <T extends string>(
  plain: string,
  index: number,
  topics: Topics<T>,
): { topic: T; at: number } | undefined => {
  let best: { topic: T; at: number } | undefined;
  const before = plain.slice(0, index);
  for (const [topic, words] of topics)
    for (const match of before.matchAll(words))
      if (best === undefined || match.index > best.at) best = { topic, at: match.index };
  return best;
};

/** The first topic named behind an offset. */
export const topicAfter = <T extends string>(
  plain: string,
  end: number,
  topics: Topics<T>,
): { topic: T; at: number } | undefined => {
  let best: { topic: T; at: number } | undefined;
  const after = plain.slice(end);
  for (const [topic, words] of topics) {
    const at = after.search(words);
    if (at >= 0 && (best === undefined || at + end < best.at)) best = { topic, at: at + end };
  }
  return best;
};

/** The topic of a place in a clause: the nearest before it, or the first behind it when none stands before. */
export const topicAt = <T extends string>(
  plain: string,
  place: { index: number; length: number },
  topics: Topics<T>,
): T | undefined =>
  (topicBefore(plain, place.index, topics) ?? topicAfter(plain, place.index + place.length, topics))?.topic;
