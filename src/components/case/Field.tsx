import { memo, useCallback, useMemo } from 'react';
import type { FieldSpec } from '../../domain/record/field-tree.ts';
import { type FieldPath, valueAt } from '../../domain/record/paths.ts';
import { ok } from '../../domain/result.ts';
import { EntryBox } from '../ui/EntryBox.tsx';
import {
  type Reading,
  readClock,
  readDate,
  readDateTime,
  readNumber,
  readNumbers,
  showClock,
  showDate,
  showDateTime,
  showNumber,
  showNumbers,
} from '../ui/entry.ts';
import { Picker } from '../ui/Picker.tsx';
import { Segments } from '../ui/Segments.tsx';
import { Toggles } from '../ui/Toggles.tsx';
import { Group } from './Group.tsx';
import { List } from './List.tsx';
import { useDesk, useDeskTools } from './use-desk.ts';
import { WordButtons } from './WordButtons.tsx';

interface Props {
  spec: FieldSpec;
  path: FieldPath;
  /** Stands in a row with others, so that it takes as little room as it can. */
  compact?: boolean;
  /** The unit is printed by another field of the row. */
  unitless?: boolean;
  /** Shorter labels of options, where the row says the rest. */
  short?: Readonly<Record<string, string>> | undefined;
  /** Room for the box, in characters. */
  size?: number | undefined;
}

const yesNo = { yes: 'yes', no: 'no' };
const showText = (value: string) => value;

const noOptions: Readonly<Record<string, string>> = {};
const optionsOf = (spec: FieldSpec) => ('options' in spec ? spec.options : noOptions);

/** Room that a box needs, in characters. */
const sizeOf = (spec: FieldSpec): number => {
  if (spec.kind === 'number') return spec.unit === 'o’clock' ? 5 : Math.max(4, String(spec.max).length);
  if (spec.kind === 'date') return 11;
  if (spec.kind === 'date-time') return 18;
  return spec.kind === 'numbers' ? 6 : 10;
};

const useReader = (spec: FieldSpec) => {
  const { store, now } = useDeskTools();
  return useCallback(
    (typed: string): Reading<unknown> => {
      if (spec.kind === 'number') {
        return spec.unit === 'o’clock' ? readClock(typed) : readNumber(typed, spec);
      }
      if (spec.kind === 'numbers') return readNumbers(typed);
      if (spec.kind === 'date') return readDate(typed, now());
      if (spec.kind === 'date-time') {
        const day = store.get().record.who?.startedAt?.slice(0, 10) ?? now().slice(0, 10);
        return readDateTime(typed, now(), day);
      }
      const most = spec.kind === 'long-text' ? 4000 : 200;
      const text = typed.trim();
      if (text.length > most) {
        return { ok: false, error: { code: 'too-long', message: `Write at most ${most} characters.` } };
      }
      return ok(text === '' ? undefined : text);
    },
    [spec, store, now],
  );
};

const shower = (spec: FieldSpec) => (value: unknown) => {
  if (typeof value === 'number') {
    return spec.kind === 'number' && spec.unit === 'o’clock' ? showClock(value) : showNumber(value);
  }
  if (Array.isArray(value)) return showNumbers(value.map(Number));
  if (typeof value !== 'string') return '';
  if (spec.kind === 'date') return showDate(value);
  return spec.kind === 'date-time' ? showDateTime(value) : showText(value);
};

const Box = ({ spec, path, compact, unitless, size }: Props) => {
  const { store, readOnly } = useDeskTools();
  const value = useDesk((state) => valueAt(state.record, path));
  const bad = useDesk((state) => state.bad[path]);
  const describedBy = useDesk((state) => state.described.get(path));
  const read = useReader(spec);
  const show = useCallback((shown: unknown) => shower(spec)(shown), [spec]);
  const isWord = typeof value === 'string' && Object.hasOwn(spec.words, value);
  const isText = spec.kind === 'text' || spec.kind === 'long-text';
  return (
    <EntryBox
      id={path}
      label={spec.title}
      value={isWord ? undefined : value}
      show={show}
      read={read}
      onChange={(next) => store.record(path, next)}
      bad={bad}
      onBad={(entry) => store.setBad(path, entry)}
      lines={spec.kind === 'long-text'}
      numeric={spec.kind === 'number'}
      readOnly={readOnly}
      describedBy={describedBy}
      {...(spec.kind === 'number' && spec.unit !== '' && unitless !== true ? { unit: spec.unit } : {})}
      {...(isText && compact !== true ? {} : { size: size ?? sizeOf(spec) })}
    />
  );
};

const Choice = ({ spec, path, compact, short }: Props) => {
  const { store, readOnly } = useDeskTools();
  const value = useDesk((state) => valueAt(state.record, path));
  const describedBy = useDesk((state) => state.described.get(path));
  const isYesNo = spec.kind === 'yes-no';
  const options = useMemo(
    () => (isYesNo ? yesNo : { ...optionsOf(spec), ...spec.words, ...short }),
    [isYesNo, spec, short],
  );
  const chosen = isYesNo ? (value === undefined ? undefined : value === true ? 'yes' : 'no') : value;
  const onChange = useCallback(
    (next: string | undefined) => store.record(path, isYesNo && next !== undefined ? next === 'yes' : next),
    [store, path, isYesNo],
  );
  const labels = Object.values(options);
  const room = compact === true ? 20 : 72;
  const asButtons = isYesNo || (labels.length <= 5 && labels.join('').length <= room);
  const shared = {
    id: path,
    label: spec.title,
    options,
    value: typeof chosen === 'string' ? chosen : undefined,
    onChange,
    describedBy,
    readOnly,
  };
  return asButtons ? (
    <Segments {...shared} />
  ) : (
    <Picker {...shared} empty={compact === true ? `${spec.title.toLowerCase()} …` : 'not recorded'} />
  );
};

const Choices = ({ spec, path }: Props) => {
  const { store, readOnly } = useDeskTools();
  const value = useDesk((state) => valueAt(state.record, path));
  const describedBy = useDesk((state) => state.described.get(path));
  const onChange = useCallback((next: string[] | undefined) => store.record(path, next), [store, path]);
  return (
    <Toggles
      id={path}
      label={spec.title}
      options={optionsOf(spec)}
      value={Array.isArray(value) ? value : undefined}
      onChange={onChange}
      describedBy={describedBy}
      readOnly={readOnly}
    />
  );
};

const Control = ({ spec, ...rest }: Props) => {
  switch (spec.kind) {
    case 'choice':
    case 'yes-no':
    case 'words':
      return <Choice spec={spec} {...rest} />;
    case 'choices':
      return <Choices spec={spec} {...rest} />;
    case 'list':
      return <List spec={spec} path={rest.path} />;
    case 'group':
      return <Group fields={spec.fields} path={rest.path} nested />;
    default:
      return <Box spec={spec} {...rest} />;
  }
};

/** One field of the record: its control, the words that may stand in place of a value, and its flag. */
export const Field = memo(({ spec, path, compact = false, unitless = false, short, size }: Props) => {
  const level = useDesk((state) => state.levels.get(path));
  const isLit = useDesk((state) => state.lit.includes(path));
  const standsAlone = spec.kind === 'choice' || spec.kind === 'yes-no' || spec.kind === 'words';
  const hasWords = Object.keys(spec.words).length > 0 && !standsAlone && spec.kind !== 'list';
  return (
    <span className="case-field" data-path={path} data-level={level} data-lit={isLit || undefined}>
      {hasWords && (spec.kind === 'group' || spec.kind === 'choices') && (
        <WordButtons spec={spec} path={path} compact={compact} />
      )}
      <Control spec={spec} path={path} compact={compact} unitless={unitless} short={short} size={size} />
      {hasWords && spec.kind !== 'group' && spec.kind !== 'choices' && (
        <WordButtons spec={spec} path={path} compact={compact} />
      )}
    </span>
  );
});
