import { type KeyboardEvent, memo } from 'react';

interface Props {
  id: string;
  label: string;
  options: Readonly<Record<string, string>>;
  value: string | undefined;
  onChange: (value: string | undefined) => void;
  describedBy?: string | undefined;
  readOnly?: boolean;
}

/** One of a few values, as buttons in a row. Arrows or the first letter choose; Delete, or a second press, clears. */
export const Segments = memo(({ id, label, options, value, onChange, describedBy, readOnly }: Props) => {
  const keys = Object.keys(options);

  const onKeyDown = (event: KeyboardEvent) => {
    if (readOnly === true || event.altKey || event.ctrlKey || event.metaKey) return;
    if (event.key === 'Delete' || event.key === 'Backspace') {
      event.preventDefault();
      onChange(undefined);
      return;
    }
    if (event.key.length !== 1 || event.key === ' ') return;
    const letter = event.key.toLowerCase();
    const fitting = keys.filter((key) => (options[key] ?? '').toLowerCase().startsWith(letter));
    const next = fitting[(fitting.indexOf(value ?? '') + 1) % fitting.length];
    if (next === undefined) return;
    event.preventDefault();
    onChange(next);
    document.getElementById(`${id}=${next}`)?.focus();
  };

  return (
    <div
      id={id}
      className="case-segments"
      role="radiogroup"
      aria-label={label}
      aria-describedby={describedBy}
      onKeyDown={onKeyDown}
    >
      {keys.map((key) => (
        <label key={key} className="case-segment">
          <input
            id={`${id}=${key}`}
            type="radio"
            name={id}
            value={key}
            checked={value === key}
            disabled={readOnly}
            onChange={() => onChange(key)}
            onClick={() => {
              if (value === key) onChange(undefined);
            }}
          />
          <span>{options[key]}</span>
        </label>
      ))}
    </div>
  );
});
