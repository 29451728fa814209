/** A repeatable source of chance: the same start gives the same draws on every machine. */
export interface Random {
  /** In [0, 1). */
  next(): number;
  chance(probability: number): boolean;
  /** Whole number, both ends included. */
  whole(from: number, to: number): number;
  /** A multiple of `step`, both ends included. */
  stepped(from: number, to: number, step: number): number;
  pick<T>(items: readonly T[]): T;
  weighted<T>(items: readonly (readonly [number, T])[]): T;
  shuffled<T>(items: readonly T[]): T[];
}

export const round = (value: number, step: number): number =>
  Number((Math.round(value / step) * step).toFixed(4));

/** Mulberry32 over a mixed start, so that neighbouring starts do not resemble each other. */
export const randomFrom = (start: number): Random => {
  let state = Math.imul(start + 0x9e3779b9, 0x85ebca6b) >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  for (let turn = 0; turn < 4; turn += 1) next();
  const whole = (from: number, to: number) => from + Math.floor(next() * (to - from + 1));
  const pick = <T>(items: readonly T[]): T => {
    const item = items[Math.floor(next() * items.length)];
    if (item === undefined) throw new Error('Nothing to pick from');
    return item;
  };
  return {
    next,
    whole,
    pick,
    chance: (probability) => next() < probability,
    stepped: (from, to, step) => round(from + step * whole(0, Math.round((to - from) / step)), step / 10),
    weighted: (items) => {
      const total = items.reduce((sum, [weight]) => sum + weight, 0);
      let left = next() * total;
      for (const [weight, item] of items) {
        left -= weight;
        if (left < 0) return item;
      }
      return pick(items)[1];
    },
    shuffled: (items) => {
      const copy = [...items];
      for (let at = copy.length - 1; at > 0; at -= 1) {
        const other = whole(0, at);
        const [a, b] = [copy[at], copy[other]];
        if (a !== undefined && b !== undefined) {
          copy[at] = b;
          copy[other] = a;
        }
      }
      return copy;
    },
  };
};
