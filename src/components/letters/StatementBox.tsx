import type { Statement } from '../../domain/drafting/sheet.ts';
import { withWords } from '../../domain/letters/words.ts';
import type { ProseFinding } from '../../domain/prose/finding.ts';

interface Props {
  statement: Statement;
  /** Where it stands, for those who cannot see it: "Diagnosis, sentence 2". */
  label: string;
  denied: readonly ProseFinding[];
  /** What somebody else has made of it meanwhile, when that differs. */
  theirs: string | undefined;
  onChange: (statement: Statement) => void;
}

const notes = { deleted: 'taken out', edited: 'changed', parted: 'changed' } as const;

/** One statement of a letter that can be written in, with the way back to what was drafted. */
export const StatementBox = ({ statement, label, denied, theirs, onChange }: Props) => {
  const { id, origin, text, drafted } = statement;
  const say = (words: string) => onChange(withWords(statement, words));
  const hint = `hint-${id}`;
  const isDenied = denied.length > 0;
  return (
    <div className="my-1">
      <textarea
        aria-label={label}
        aria-describedby={isDenied ? hint : undefined}
        aria-invalid={isDenied}
        className="letter-words"
        rows={Math.max(1, Math.ceil(text.length / 64))}
        value={text}
        placeholder={origin === 'deleted' ? drafted : undefined}
        onChange={(event) => say(event.target.value)}
      />
      {isDenied && (
        <p id={hint} className="error font-sans">
          {denied.map(({ words, recorded }) => `“${words}”: the signed note says ${recorded}.`).join(' ')}
        </p>
      )}
      {theirs !== undefined && (
        <p className="notice font-sans">
          Saved meanwhile: {theirs === '' ? 'taken out' : `“${theirs}”`}{' '}
          <button type="button" className="letter-back" onClick={() => say(theirs)}>
            Use it here
          </button>
        </p>
      )}
      {(origin === 'deleted' || origin === 'edited' || origin === 'parted') && (
        <p className="font-sans text-sm text-soft">
          {notes[origin]} ·{' '}
          <button
            type="button"
            className="letter-back"
            aria-label={`Put back what was drafted: ${label}`}
            title={drafted}
            onClick={() => say(drafted)}
          >
            Put back what was drafted
          </button>
        </p>
      )}
    </div>
  );
};
