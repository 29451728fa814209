import { useState } from 'react';

export interface ReaderOption {
  id: string;
  name: string;
  practice: string;
  address: string;
  email: string;
  isConfirmed: boolean;
  /** The signed note names this reader; the reason for the suggestion. */
  isNamed: boolean;
}

interface Props {
  readers: readonly ReaderOption[];
  chosen: string | null;
  /** What the named reader is to the patient: "referring doctor". */
  namedAs: string;
  isOpen: boolean;
  onChoose: (id: string | null) => void;
}

const MANY = 8;

const holds = (one: ReaderOption, sought: string): boolean =>
  `${one.name} ${one.practice} ${one.address} ${one.email}`.toLowerCase().includes(sought.toLowerCase());

/** Whom the letter goes to. Whoever is named in the note comes first, with that reason; nobody is chosen silently. */
export const ReaderChoice = ({ readers, chosen, namedAs, isOpen, onChoose }: Props) => {
  const [sought, setSought] = useState('');
  const shown = readers
    .filter((one) => one.id === chosen || (isOpen && (sought === '' || holds(one, sought))))
    .sort((a, b) => Number(b.isNamed) - Number(a.isNamed));
  return (
    <fieldset disabled={!isOpen}>
      <legend className="label">Goes to</legend>
      {isOpen && readers.length > MANY && (
        <input
          className="input"
          type="search"
          aria-label="Look for a reader"
          placeholder="Look for a name or a practice"
          value={sought}
          onChange={(event) => setSought(event.target.value)}
        />
      )}
      {shown.map((one) => (
        <label key={one.id} className="mt-2 flex gap-3">
          <input
            type="radio"
            name="reader"
            className="mt-1 size-5 shrink-0 accent-cloth"
            checked={chosen === one.id}
            disabled={!one.isConfirmed && chosen !== one.id}
            onChange={() => onChoose(one.id)}
          />
          <span>
            {one.name}, {one.practice}
            <span className="block text-sm text-soft">
              {one.address}
              <br />
              {one.email}
            </span>
            {one.isNamed && (
              <span className="block text-sm font-semibold text-cloth">
                suggested: named in the signed note as {namedAs}
              </span>
            )}
            {!one.isConfirmed && (
              <span className="block text-sm font-semibold text-ochre">
                address not confirmed; confirm it in the directory first
              </span>
            )}
          </span>
        </label>
      ))}
      {isOpen && shown.length === 0 && (
        <p>{readers.length === 0 ? 'The directory is empty.' : 'Nobody in the directory fits.'}</p>
      )}
      {!isOpen && shown.length === 0 && <p>Nobody of the directory.</p>}
      {isOpen && (
        <p className="mt-3">
          <a href="/recipients">Directory</a>
        </p>
      )}
    </fieldset>
  );
};
