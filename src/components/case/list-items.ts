import type { FieldSpec } from '../../domain/record/field-tree.ts';
import { showClock } from '../ui/entry.ts';

type ListSpec = Extract<FieldSpec, { kind: 'list' }>;

const inside = (item: unknown, name: string): unknown =>
  typeof item === 'object' && item !== null ? (item as Record<string, unknown>)[name] : undefined;

/** An item in a few words, for its tab: "horseshoe tear at 2". Empty when nothing telling is recorded. */
export const itemSummary = (spec: ListSpec, item: unknown): string => {
  const kind = spec.fields.find((field) => field.kind === 'choice');
  const value = kind === undefined ? undefined : inside(item, kind.name);
  const label = kind?.kind === 'choice' && typeof value === 'string' ? (kind.options[value] ?? '') : '';
  const clock = inside(item, 'clock');
  const at = typeof clock === 'number' ? `at ${showClock(clock)}` : '';
  return [label, at].filter((part) => part !== '').join(' ');
};

/**
 * A copy of an item to start the next one from. Where items have a quadrant, the copy takes the next quadrant that no
 * item has yet.
 */
export const copyOf = (spec: ListSpec, items: readonly unknown[], at: number): unknown => {
  const item = items[at];
  const quadrant = spec.fields.find((field) => field.kind === 'choice' && field.name === 'quadrant');
  if (quadrant?.kind !== 'choice' || typeof item !== 'object' || item === null) return item ?? {};
  const taken = new Set(items.map((other) => inside(other, 'quadrant')));
  const free = Object.keys(quadrant.options).find((key) => !taken.has(key));
  const { quadrant: _, ...rest } = item as Record<string, unknown>;
  return free === undefined ? rest : { quadrant: free, ...rest };
};
