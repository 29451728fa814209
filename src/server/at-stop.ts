const key = Symbol.for('buckram.at-stop');

/**
 * Registers how work in the background ends, a job queue for example. `scripts/server.mjs` calls every one of them once when the process is
 * told to stop, beside finishing the requests in progress, and waits for both, 5 seconds at most.
 */
export const atStop = (end: () => Promise<void>): void => {
  const known: unknown = Reflect.get(globalThis, key);
  if (known instanceof Set) known.add(end);
  else Reflect.set(globalThis, key, new Set([end]));
};
