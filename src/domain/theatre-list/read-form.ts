import { procedures } from '../record/procedures.ts';
import { columns, type ListRow, readRow } from './read-csv.ts';

/** What the form for one case sends; the same reader as for a line of a file decides. */
export const readListForm = (form: Readonly<Record<string, string>>, planned: readonly string[]): ListRow => {
  const known = planned.filter((name) => Object.hasOwn(procedures, name));
  const cells = Object.fromEntries(
    columns.map((column) => [column, (form[column] ?? '').trim()]),
  ) as ListRow['cells'];
  return readRow({ ...cells, 'planned procedures': known.join(';') }, 1);
};
