import { type KeyboardEvent, memo, useState } from 'react';

interface Props {
  id: string;
  label: string;
  options: Readonly<Record<string, string>>;
  value: readonly string[] | undefined;
  onChange: (value: string[] | undefined) => void;
  describedBy?: string | undefined;
  readOnly?: boolean;
}

const toggled = (value: readonly string[], key: string, order: readonly string[]): string[] => {
  if (value.includes(key)) return value.filter((other) => other !== key);
  // "None" is a statement about all the others.
  if (key === 'none') return ['none'];
  const next = [...value.filter((other) => other !== 'none'), key];
  return order.filter((other) => next.includes(other));
};

/** Any number of a few values, kept in the order in which they are offered. One stop of Tab; arrows and letters move. */
export const Toggles = memo(({ id, label, options, value, onChange, describedBy, readOnly }: Props) => {
  const keys = Object.keys(options);
  const [at, setAt] = useState(0);
  const change = (key: string) => {
    const next = toggled(value ?? [], key, keys);
    onChange(next.length === 0 ? undefined : next);
  };
  const moveTo = (index: number) => {
    setAt(index);
    document.getElementById(`${id}=${keys[index]}`)?.focus();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const letter = event.key.length === 1 && event.key !== ' ' ? event.key.toLowerCase() : '';
    const startsSo = (key: string) => letter !== '' && (options[key] ?? '').toLowerCase().startsWith(letter);
    const step = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 }[event.key];
    if (step !== undefined) moveTo((at + step + keys.length) % keys.length);
    else if (event.key === 'Delete' && readOnly !== true) onChange(undefined);
    else if (keys.some(startsSo)) {
      const later = keys.findIndex((key, index) => index > at && startsSo(key));
      moveTo(later === -1 ? keys.findIndex(startsSo) : later);
    } else return;
    event.preventDefault();
  };
  return (
    <fieldset
      id={id}
      className="case-toggles"
      aria-label={label}
      aria-describedby={describedBy}
      onKeyDown={onKeyDown}
    >
      {keys.map((key, index) => (
        <label key={key} className="case-toggle">
          <input
            id={`${id}=${key}`}
            type="checkbox"
            tabIndex={index === at ? 0 : -1}
            checked={value?.includes(key) === true}
            disabled={readOnly}
            onFocus={() => setAt(index)}
            onChange={() => change(key)}
          />
          <span>{options[key]}</span>
        </label>
      ))}
    </fieldset>
  );
});
