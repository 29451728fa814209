import { useEffect, useId, useRef, useState } from 'react';
import type { Reading } from './entry.ts';

export interface BadEntry {
  text: string;
  message: string;
}

interface Props<T> {
  id: string;
  /** Accessible name. */
  label: string;
  value: T | undefined;
  show: (value: T) => string;
  read: (typed: string) => Reading<T>;
  onChange: (value: T | undefined) => void;
  /** What was typed here before and could not be read. */
  bad: BadEntry | undefined;
  onBad: (bad: BadEntry | undefined) => void;
  unit?: string;
  /** Width of the box in characters; without it the box fills its row. */
  size?: number;
  lines?: boolean;
  describedBy?: string | undefined;
  numeric?: boolean;
  readOnly?: boolean;
}

/**
 * A box that is typed into. What cannot be read stays in the box, is never handed on, and is explained beside it once
 * the box is left.
 */
export const EntryBox = <T,>(props: Props<T>) => {
  const {
    id,
    label,
    value,
    show,
    read,
    onChange,
    bad,
    onBad,
    unit,
    size,
    lines,
    describedBy,
    numeric,
    readOnly,
  } = props;
  const [text, setText] = useState(bad?.text ?? (value === undefined ? '' : show(value)));
  const [left, setLeft] = useState(bad !== undefined);
  const handedOn = useRef<T | undefined>(value);
  const errorId = useId();
  const unitId = useId();

  // A change that came from elsewhere (undo, another version) replaces what stands in the box.
  useEffect(() => {
    if (JSON.stringify(handedOn.current) === JSON.stringify(value)) return;
    handedOn.current = value;
    setText(value === undefined ? '' : show(value));
  }, [value, show]);

  const type = (typed: string) => {
    setText(typed);
    const reading = read(typed);
    if (!reading.ok) {
      onBad({ text: typed, message: reading.error.message });
      return;
    }
    if (bad !== undefined) onBad(undefined);
    handedOn.current = reading.value;
    onChange(reading.value);
  };

  const leave = () => {
    setLeft(true);
    if (bad === undefined && handedOn.current !== undefined) setText(show(handedOn.current));
  };

  const error = left ? bad?.message : undefined;
  const described = [unit === undefined ? '' : unitId, error === undefined ? '' : errorId, describedBy ?? '']
    .filter((part) => part !== '')
    .join(' ');
  const shared = {
    id,
    'aria-label': label,
    'aria-invalid': error !== undefined,
    'aria-describedby': described === '' ? undefined : described,
    className: 'case-box',
    value: text,
    readOnly,
    autoComplete: 'off',
    onBlur: leave,
  };

  return (
    <span className={size === undefined ? 'case-entry case-entry-wide' : 'case-entry'}>
      {lines === true ? (
        <textarea {...shared} rows={2} onChange={(event) => type(event.target.value)} />
      ) : (
        <input
          {...shared}
          type="text"
          inputMode={numeric === true ? 'decimal' : 'text'}
          style={size === undefined ? undefined : { width: `${size + 2}ch` }}
          onChange={(event) => type(event.target.value)}
        />
      )}
      {unit !== undefined && (
        <span id={unitId} className="case-unit">
          {unit}
        </span>
      )}
      {error !== undefined && (
        <span id={errorId} className="case-error" role="alert">
          {error}
        </span>
      )}
    </span>
  );
};
