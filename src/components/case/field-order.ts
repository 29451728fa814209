import { type FieldSpec, fieldTree } from '../../domain/record/field-tree.ts';
import { type FieldPath, valueAt } from '../../domain/record/paths.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';
import type { Row } from './layouts/row.ts';
import { layoutOf } from './stage-layouts.ts';

/** The field of a group by its name in a layout, which may reach into a group inside: `pvr.grade`. */
export const specNamed = (fields: readonly FieldSpec[], name: string): FieldSpec | undefined => {
  let found: FieldSpec | undefined;
  let inside = fields;
  for (const key of name.split('.')) {
    found = inside.find((field) => field.name === key);
    inside = found !== undefined && 'fields' in found ? found.fields : [];
  }
  return found;
};

/** Whether a row is of use now: it applies, or something is recorded in it. */
export const isShown = (record: CaseRecord, groupPath: FieldPath, row: Row): boolean =>
  row.when === undefined ||
  row.when((name) => valueAt(record, `${groupPath}.${name}`)) ||
  row.fields.some((name) => valueAt(record, `${groupPath}.${name}`) !== undefined);

const inGroup = (record: CaseRecord, fields: readonly FieldSpec[], path: FieldPath): FieldPath[] =>
  layoutOf(path, fields)
    .usual.filter((row) => isShown(record, path, row))
    .flatMap((row) => row.fields)
    .flatMap((name) => {
      const spec = specNamed(fields, name);
      return spec === undefined ? [] : inField(record, spec, `${path}.${name}`);
    });

const inField = (record: CaseRecord, spec: FieldSpec, path: FieldPath): FieldPath[] => {
  if (spec.kind === 'group') {
    return typeof valueAt(record, path) === 'string' ? [path] : inGroup(record, spec.fields, path);
  }
  if (spec.kind !== 'list') return [path];
  const items = valueAt(record, path);
  return Array.isArray(items)
    ? items.flatMap((_, index) => inGroup(record, spec.fields, `${path}.${index}`))
    : [path];
};

/** The usual fields of the record as they stand on the page, stage by stage; items of lists one after another. */
export const fieldsInOrder = (record: CaseRecord): FieldPath[] =>
  fieldTree.flatMap((stage) => inField(record, stage, stage.name));

/** The next usual field with nothing recorded after a place, starting again at the top; `null` when none is left. */
export const nextEmpty = (record: CaseRecord, from: FieldPath | null): FieldPath | null => {
  const order = fieldsInOrder(record);
  const exact = from === null ? -1 : order.indexOf(from);
  const start =
    exact === -1 && from !== null ? order.findIndex((path) => path.startsWith(`${from}.`)) - 1 : exact;
  const turned = [...order.slice(Math.max(start, -1) + 1), ...order.slice(0, Math.max(start, -1) + 1)];
  return turned.find((path) => path !== from && valueAt(record, path) === undefined) ?? null;
};

/** Paths of the groups whose less usual rows hide a field. */
export const groupsHiding = (path: FieldPath): FieldPath[] => {
  const keys = path.split('.');
  const hiding: FieldPath[] = [];
  let fields: readonly FieldSpec[] = fieldTree;
  let here = '';
  keys.forEach((key, index) => {
    if (/^\d+$/.test(key)) {
      here = `${here}.${key}`;
      return;
    }
    if (here !== '') {
      const rest = keys.slice(index).filter((part) => !/^\d+$/.test(part));
      const { more } = layoutOf(here, fields);
      const named = more.flatMap((row) => row.fields);
      if (named.some((name) => name === rest[0] || name === `${rest[0]}.${rest[1]}`)) hiding.push(here);
    }
    const spec = fields.find((field) => field.name === key);
    fields = spec !== undefined && 'fields' in spec ? spec.fields : [];
    here = here === '' ? key : `${here}.${key}`;
  });
  return hiding;
};
