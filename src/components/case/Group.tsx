import { memo } from 'react';
import type { FieldSpec } from '../../domain/record/field-tree.ts';
import { type FieldPath, valueAt } from '../../domain/record/paths.ts';
import { Field } from './Field.tsx';
import { Figures } from './Figures.tsx';
import { isShown, specNamed } from './field-order.ts';
import { focusSoon } from './focus-field.ts';
import type { Row } from './layouts/row.ts';
import { layoutOf } from './stage-layouts.ts';
import { useDesk, useDeskTools } from './use-desk.ts';

interface GroupProps {
  fields: readonly FieldSpec[];
  path: FieldPath;
  /** Stands inside a row of another group. */
  nested?: boolean;
}

/** Says again what is recorded elsewhere, while nothing is recorded here. */
const SameAs = ({ from, words, to }: { from: FieldPath; words: string; to: FieldPath }) => {
  const { store, readOnly } = useDeskTools();
  const offered = useDesk(
    (state) => valueAt(state.record, from) !== undefined && valueAt(state.record, to) === undefined,
  );
  if (!offered || readOnly) return null;
  const say = () => {
    store.record(to, valueAt(store.get().record, from));
    focusSoon(to);
  };
  return (
    <button type="button" className="case-word case-add" onClick={say}>
      {words}
    </button>
  );
};

const RowLine = memo(({ row, fields, path }: { row: Row; fields: readonly FieldSpec[]; path: FieldPath }) => {
  const shown = useDesk(
    (state) =>
      isShown(state.record, path, row) || row.fields.some((name) => state.levels.has(`${path}.${name}`)),
  );
  if (!shown) return null;
  const placed = row.fields.flatMap((name, index) => {
    const spec = specNamed(fields, name);
    return spec === undefined ? [] : [{ spec, name, before: row.between?.[index] ?? '' }];
  });
  const compact = placed.length > 1;
  return (
    <div className="case-row">
      <span className="case-row-label">{row.label ?? placed[0]?.spec.title}</span>
      <div className="case-row-fields">
        {placed.map(({ spec, name, before }) => (
          <span key={name} className="case-slot">
            {before !== '' && (
              <span className="case-between" aria-hidden="true">
                {before}
              </span>
            )}
            <Field
              spec={spec}
              path={`${path}.${name}`}
              compact={compact}
              short={row.short}
              size={row.sizes?.[name]}
              unitless={row.unitless?.includes(name) === true}
            />
          </span>
        ))}
        {row.sameAs !== undefined && (
          <SameAs from={row.sameAs.path} words={row.sameAs.words} to={`${path}.${row.fields[0]}`} />
        )}
        {placed.length === 1 && placed[0]?.spec.help !== undefined && (
          <span className="case-help">{placed[0].spec.help}</span>
        )}
      </div>
      <Figures paths={row.fields.map((name) => `${path}.${name}`).join(' ')} />
    </div>
  );
});

const moreTitle = (rows: readonly Row[], fields: readonly FieldSpec[]) =>
  rows
    .map((row) => row.label ?? specNamed(fields, row.fields[0] ?? '')?.title ?? '')
    .join(', ')
    .toLowerCase();

/** The fields of a group in rows; the less usual ones on request, or when one of them is recorded. */
export const Group = memo(({ fields, path, nested = false }: GroupProps) => {
  const { store } = useDeskTools();
  const { usual, more } = layoutOf(path, fields);
  const isWord = useDesk((state) => typeof valueAt(state.record, path) === 'string');
  const asked = useDesk((state) => state.expanded[path]);
  const recorded = useDesk((state) =>
    more.some((row) => row.fields.some((name) => valueAt(state.record, `${path}.${name}`) !== undefined)),
  );
  if (isWord) return null;
  const shown = asked ?? recorded;
  const id = `${path}:more`;
  return (
    <div id={nested ? path : undefined} className={nested ? 'case-group case-group-nested' : 'case-group'}>
      {usual.map((row) => (
        <RowLine key={row.fields.join(' ')} row={row} fields={fields} path={path} />
      ))}
      {more.length > 0 && (
        <button
          type="button"
          className="case-more"
          aria-expanded={shown}
          aria-controls={id}
          onClick={() => store.expand(path, !shown)}
        >
          {shown ? 'Fewer' : 'More'}
          {!shown && <span className="case-more-names">: {moreTitle(more, fields)}</span>}
        </button>
      )}
      <div id={id}>
        {shown &&
          more.map((row) => <RowLine key={row.fields.join(' ')} row={row} fields={fields} path={path} />)}
      </div>
    </div>
  );
});
