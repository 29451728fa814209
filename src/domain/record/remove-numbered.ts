import { type FieldPath, valueAt, withoutItem, withValue } from './paths.ts';
import type { CaseRecord } from './schema.ts';

/** Lists whose items are called by number elsewhere, and where. */
const callers: Readonly<Record<FieldPath, { list: FieldPath; field: string }>> = {
  'breaks.found': { list: 'retinopexy.treatments', field: 'targets' },
  'buckle.elements': { list: 'breaks.found', field: 'supportedByElements' },
};

const renumbered = (numbers: readonly number[], removed: number): number[] =>
  numbers.filter((number) => number !== removed).map((number) => (number > removed ? number - 1 : number));

/**
 * A copy without one item of a list. Numbers elsewhere that call the items behind it move up with them; a number that
 * called the removed item goes.
 */
export const withoutNumbered = (record: CaseRecord, listPath: FieldPath, index: number): CaseRecord => {
  const rest = withoutItem(record, listPath, index);
  const caller = callers[listPath];
  const calling = caller === undefined ? undefined : valueAt(rest, caller.list);
  if (caller === undefined || !Array.isArray(calling)) return rest;
  return calling.reduce((changed: CaseRecord, _, at) => {
    const path = `${caller.list}.${at}.${caller.field}`;
    const numbers = valueAt(changed, path);
    if (!Array.isArray(numbers)) return changed;
    const next = renumbered(numbers, index + 1);
    return withValue(changed, path, next.length === 0 ? undefined : next);
  }, rest);
};
