import type { CaseRecord } from './schema.ts';

/** A place in a record, dotted: `buckle.elements.0.widthMm`. It is also the id of the field on the page. */
export type FieldPath = string;

type Node = { readonly [key: string]: unknown } | readonly unknown[];

const isNode = (value: unknown): value is Node => typeof value === 'object' && value !== null;

const child = (node: Node, key: string): unknown =>
  Array.isArray(node)
    ? node[Number(key)]
    : Object.hasOwn(node, key)
      ? (node as Record<string, unknown>)[key]
      : undefined;

/** The value at a path, or `undefined` when nothing is recorded there. */
export const valueAt = (record: CaseRecord, path: FieldPath): unknown => {
  let value: unknown = record;
  for (const key of path.split('.')) {
    if (!isNode(value)) return undefined;
    value = child(value, key);
  }
  return value;
};

const isEmptyObject = (value: unknown) =>
  isNode(value) && !Array.isArray(value) && Object.keys(value).length === 0;

const place = (node: unknown, [key, ...rest]: readonly string[], value: unknown): unknown => {
  if (key === undefined) return value;
  const inside = place(isNode(node) ? child(node, key) : undefined, rest, value);
  if (Array.isArray(node) || (!isNode(node) && /^\d+$/.test(key))) {
    const items: unknown[] = Array.isArray(node) ? [...node] : [];
    // An item that lost its last field stays: breaks and elements are numbered by their place.
    items[Number(key)] = inside ?? {};
    return items;
  }
  const copy: Record<string, unknown> = isNode(node) ? { ...node } : {};
  if (inside === undefined || (rest.length > 0 && isEmptyObject(inside))) delete copy[key];
  else copy[key] = inside;
  return Object.keys(copy).length === 0 ? undefined : copy;
};

/**
 * A copy of the record with one value changed; `undefined` makes the field absent again. Groups that become empty
 * go with it. Everything that did not change is shared with the original.
 */
export const withValue = (record: CaseRecord, path: FieldPath, value: unknown): CaseRecord =>
  place(record, path.split('.'), value) as CaseRecord;

/** A copy without one item of a list; the list becomes absent when it was the last. */
export const withoutItem = (record: CaseRecord, listPath: FieldPath, index: number): CaseRecord => {
  const list = valueAt(record, listPath);
  if (!Array.isArray(list)) return record;
  const rest = list.filter((_, at) => at !== index);
  return withValue(record, listPath, rest.length === 0 ? undefined : rest);
};

/** Whether a path is another's or lies inside it. */
export const covers = (outer: FieldPath, inner: FieldPath): boolean =>
  inner === outer || inner.startsWith(`${outer}.`);
