import type { FieldSpec } from '../../domain/record/field-tree.ts';
import { afterLayouts } from './layouts/after.ts';
import { beforeLayouts } from './layouts/before.ts';
import { breaksLayouts } from './layouts/breaks.ts';
import { buckleLayouts } from './layouts/buckle.ts';
import type { Layout, Row } from './layouts/row.ts';
import { vitreousLayouts } from './layouts/vitreous.ts';
import { whoLayouts } from './layouts/who.ts';

/** Layouts by the path of their group, without item numbers. A group without one shows its fields in rows. */
export const layouts: Readonly<Record<string, Layout>> = {
  ...whoLayouts,
  ...beforeLayouts,
  ...breaksLayouts,
  ...buckleLayouts,
  ...vitreousLayouts,
  ...afterLayouts,
};

/** Lists whose items have many fields: one item is open at a time. The others show all their items in lines. */
export const isPaged = (listPath: string): boolean =>
  ['breaks.found', 'buckle.elements', 'retinopexy.treatments'].includes(listPath);

const named = (rows: readonly Row[]) => rows.flatMap((row) => row.fields.map((name) => name.split('.')[0]));

/** Layout of a group by its path without item numbers. Fields that no row names come last, among the less usual. */
export const layoutOf = (groupPath: string, fields: readonly FieldSpec[]): Required<Layout> => {
  const found = layouts[groupPath.replace(/\.\d+/g, '')];
  if (found === undefined) return { usual: fields.map((field) => ({ fields: [field.name] })), more: [] };
  const more = found.more ?? [];
  const placed = new Set([...named(found.usual), ...named(more)]);
  const rest = fields.filter((field) => !placed.has(field.name)).map((field) => ({ fields: [field.name] }));
  return { usual: found.usual, more: [...more, ...rest] };
};
