import { memo } from 'react';
import type { FieldSpec } from '../../domain/record/field-tree.ts';
import { type FieldPath, valueAt } from '../../domain/record/paths.ts';
import { focusSoon } from './focus-field.ts';
import { Group } from './Group.tsx';
import { copyOf, itemSummary } from './list-items.ts';
import { isPaged } from './stage-layouts.ts';
import { useDesk, useDeskTools } from './use-desk.ts';
import { WordButtons } from './WordButtons.tsx';

type ListSpec = Extract<FieldSpec, { kind: 'list' }>;

interface Props {
  spec: ListSpec;
  path: FieldPath;
}

const capital = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

const Tab = ({ spec, path, at }: Props & { at: number }) => {
  const { store } = useDeskTools();
  const summary = useDesk((state) => itemSummary(spec, valueAt(state.record, `${path}.${at}`)));
  const isOpen = useDesk((state) => (state.open[path] ?? 0) === at);
  return (
    <button
      type="button"
      className="case-item-tab"
      aria-pressed={isOpen}
      aria-label={`${capital(spec.item)} ${at + 1}${summary === '' ? '' : `, ${summary}`}`}
      onClick={() => store.openItem(path, at)}
    >
      <b>{at + 1}</b> {summary}
    </button>
  );
};

const Item = memo(({ spec, path, at }: Props & { at: number }) => {
  const { store, readOnly } = useDeskTools();
  const name = `${capital(spec.item)} ${at + 1}`;
  const copy = () => {
    const { record } = store.get();
    const items = valueAt(record, path);
    const next = Array.isArray(items) ? items.length : 0;
    store.addItem(path, next, copyOf(spec, Array.isArray(items) ? items : [], at));
    focusSoon(`${path}.${next}`);
  };
  const remove = () => {
    store.removeItem(path, at);
    focusSoon(path);
  };
  return (
    <fieldset id={`${path}.${at}`} className="case-item" aria-label={name} data-path={`${path}.${at}`}>
      <Group fields={spec.fields} path={`${path}.${at}`} />
      {!readOnly && (
        <span className="case-item-keys">
          <button
            type="button"
            className="case-link"
            onClick={copy}
            aria-label={`Copy ${name.toLowerCase()}`}
          >
            copy
          </button>
          <button
            type="button"
            className="case-link"
            onClick={remove}
            aria-label={`Remove ${name.toLowerCase()}`}
          >
            remove
          </button>
        </span>
      )}
    </fieldset>
  );
});

/** Any number of things of one kind, or the statement that there were none. */
export const List = memo(({ spec, path }: Props) => {
  const { store, readOnly } = useDeskTools();
  const count = useDesk((state) => {
    const items = valueAt(state.record, path);
    return Array.isArray(items) ? items.length : 0;
  });
  const open = useDesk((state) => state.open[path] ?? 0);
  const paged = isPaged(path);
  const add = () => {
    store.addItem(path, count);
    focusSoon(`${path}.${count}`);
  };
  const places = Array.from({ length: count }, (_, at) => at);
  const shown = paged ? places.filter((at) => at === Math.min(open, count - 1)) : places;
  return (
    <div id={path} className={paged ? 'case-list case-list-paged' : 'case-list'}>
      <span className="case-list-keys">
        {count === 0 && <WordButtons spec={spec} path={path} />}
        {paged && places.map((at) => <Tab key={at} spec={spec} path={path} at={at} />)}
        {!readOnly && (paged || count === 0) && (
          <button type="button" className="case-word case-add" onClick={add}>
            add {count === 0 ? '' : 'another '}
            {spec.item}
          </button>
        )}
      </span>
      {shown.map((at) => (
        <Item key={at} spec={spec} path={path} at={at} />
      ))}
      {!readOnly && !paged && count > 0 && (
        <button type="button" className="case-word case-add" onClick={add}>
          add another {spec.item}
        </button>
      )}
    </div>
  );
});
