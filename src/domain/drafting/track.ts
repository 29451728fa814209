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

  const wrap = <T extends object>(target: T, path: string): T => {
    const isList = Array.isArray(target);
    const children = new Map<string, object>();
    const inside = (key: string) => (path === '' ? key : `${path}.${key}`);
    const childOf = (key: string, value: object): object => {
      const before = children.get(key);
      if (before !== undefined) return before;
      const child = wrap(value, inside(key));
      children.set(key, child);
      return child;
    };
    return new Proxy(target, {
      get: (node, key): unknown => {
        const value: unknown = Reflect.get(node, key);
        if (typeof key === 'symbol' || typeof value === 'function' || unrecorded.has(key)) return value;
        if (isNode(value)) {
          // A list is a fact of its own: that it is there, and how long it is.
          if (Array.isArray(value)) current?.add(inside(key));
          return childOf(key, value);
        }
        if (!(isList && key === 'length')) current?.add(inside(key));
        return value;
      },
    });
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
