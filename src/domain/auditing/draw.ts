/** Named with every draw, so that an old one can be redrawn as it was. */
export const DRAW_ALGORITHM = 'sfc32-shuffle-1';

/** Four 32-bit words from a seed of any length (FNV-1a, each word from its own start). */
const words = (seed: string): [number, number, number, number] => {
  const hash = (start: number) => {
    let h = start >>> 0;
    for (const sign of seed) {
      h ^= sign.codePointAt(0) ?? 0;
      h = Math.imul(h, 16777619);
    }
    return h >>> 0;
  };
  return [hash(2166136261), hash(0x9e3779b9), hash(0x85ebca6b), hash(0xc2b2ae35)];
};

/** The small fast counter generator of 32-bit words; numbers from 0 up to 1. */
const generator = (seed: string): (() => number) => {
  let [a, b, c, d] = words(seed);
  const next = () => {
    const t = (((a + b) | 0) + d) | 0;
    d = (d + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (c << 21) | (c >>> 11);
    c = (c + t) | 0;
    return (t >>> 0) / 4294967296;
  };
  for (let warm = 0; warm < 12; warm += 1) next();
  return next;
};

/**
 * Draws `size` of the given ids, the same for the same seed whatever the order they come in.
 * Sorted by id, shuffled (Fisher–Yates), the first `size` taken.
 */
export const draw = (ids: readonly string[], size: number, seed: string): string[] => {
  const pool = [...new Set(ids)].sort();
  const next = generator(seed);
  for (let last = pool.length - 1; last > 0; last -= 1) {
    const other = Math.floor(next() * (last + 1));
    const kept = pool[last] ?? '';
    pool[last] = pool[other] ?? '';
    pool[other] = kept;
  }
  return pool.slice(0, Math.max(0, size));
};
