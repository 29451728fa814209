import { memo } from 'react';

interface Props {
  id: string;
  label: string;
  options: Readonly<Record<string, string>>;
  value: string | undefined;
  onChange: (value: string | undefined) => void;
  describedBy?: string | undefined;
  readOnly?: boolean;
  /** The line that stands for nothing recorded. */
  empty: string;
}

/** One of many values. The empty line at the top makes the field absent again. */
export const Picker = memo(({ id, label, options, value, onChange, describedBy, readOnly, empty }: Props) => (
  <select
    id={id}
    className="case-box case-picker"
    aria-label={label}
    aria-describedby={describedBy}
    value={value ?? ''}
    disabled={readOnly}
    onChange={(event) => onChange(event.target.value === '' ? undefined : event.target.value)}
  >
    <option value="">{empty}</option>
    {Object.entries(options).map(([key, text]) => (
      <option key={key} value={key}>
        {text}
      </option>
    ))}
  </select>
));
