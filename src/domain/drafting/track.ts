import type { CaseRecord } from '../record/schema.ts';

/** A record whose readers are noted. */
export interface Tracked {
  record: CaseRecord;
  /** Runs `read` and says which paths it read, in order, each once. */
  during: <T>(read: () => T) => { value: T; reads: string[] };
}

const isNode = (value: unknown): value is object => typeof value === 'object' && value !== null;

/** Names that template engines and printing ask every object for. */
const unrecorded = new Set<PropertyKey>([
  'toJSON',
  'toHTML',
  'toString',
  'valueOf',
  'constructor',
  'then',
  '__proto__',
]);

/**
 * Hands out a record through a proxy that notes each place read: a value, an absent value, or a list. What a statement read
 * while it was made is what it rests on.
 */
export const track = (record: CaseRecord): Tracked => {
  let current: Set<string> | undefined;
  const known = new Map<string, object>();
  const note = (path: string) => current?.add(path);

  const wrap = <T extends object>(target: T, path: string): T => {
    const before = known.get(path);
    if (before !== undefined) return before as T;
    const proxy = new Proxy(target, {
      get: (node, key, receiver): unknown => {
        const value: unknown = Reflect.get(node, key, receiver);
        if (typeof key === 'symbol' || unrecorded.has(key) || typeof value === 'function') return value;
        const inner = path === '' ? key : `${path}.${key}`;
        // A list is a fact of its own: that it is there, and how long it is.
        if (Array.isArray(value)) note(inner);
        if (isNode(value)) return wrap(value, inner);
        if (Array.isArray(node) && key === 'length') return value;
        note(inner);
        return value;
      },
    });
    known.set(path, proxy);
    return proxy;
  };

  return {
    record: wrap(record, ''),
    during: (read) => {
      const outer = current;
      const reads = new Set<string>();
      current = reads;
      try {
        return { value: read(), reads: [...reads] };
      } finally {
        current = outer;
      }
    },
  };
};
