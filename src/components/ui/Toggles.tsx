import { memo } from 'react';

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

/** Any number of a few values, kept in the order in which they are offered. */
export const Toggles = memo(({ id, label, options, value, onChange, describedBy, readOnly }: Props) => {
  const keys = Object.keys(options);
  const change = (key: string) => {
    const next = toggled(value ?? [], key, keys);
    onChange(next.length === 0 ? undefined : next);
  };
  return (
    <fieldset id={id} className="case-toggles" aria-label={label} aria-describedby={describedBy}>
      {keys.map((key) => (
        <label key={key} className="case-toggle">
          <input
            type="checkbox"
            checked={value?.includes(key) === true}
            disabled={readOnly}
            onChange={() => change(key)}
          />
          <span>{options[key]}</span>
        </label>
      ))}
    </fieldset>
  );
});
