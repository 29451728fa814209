import { type FormEvent, useState } from 'react';
import { type Flag, flagKey, isAnswered } from '../../domain/checks/flag.ts';
import { fieldLabel } from '../../domain/record/field-tree.ts';
import { flagId } from './desk-store.ts';
import type { Explain } from './explain.ts';
import { goToField } from './go-to-field.ts';
import { useDesk, useDeskTools } from './use-desk.ts';

interface Props {
  flag: Flag;
  explain: Explain;
}

const AnswerForm = ({ flag, onDone }: { flag: Flag; onDone: () => void }) => {
  const { store } = useDeskTools();
  const [reason, setReason] = useState('');
  const [error, setError] = useState('');
  const errorId = `${flagId(flag)}:error`;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (reason.trim().length < 3) {
      setError('Write the reason in a few words.');
      return;
    }
    store.answer(flag, reason.trim());
    onDone();
  };
  return (
    <form className="note-answer" onSubmit={submit}>
      <label>
        Reason, printed in the note
        <textarea
          rows={2}
          value={reason}
          aria-invalid={error !== ''}
          aria-describedby={error === '' ? undefined : errorId}
          ref={(element) => element?.focus()}
          onChange={(event) => setReason(event.target.value)}
          onKeyDown={(event) => {
            if (event.key === 'Escape') {
              event.stopPropagation();
              onDone();
            }
            if (event.key === 'Enter' && !event.shiftKey) submit(event);
          }}
        />
      </label>
      {error !== '' && (
        <p id={errorId} className="case-error" role="alert">
          {error}
        </p>
      )}
      <button type="submit" className="case-link">
        Keep the reason <kbd className="key">Enter</kbd>
      </button>
    </form>
  );
};

/** One flag in the margin: what was found, where to go, why it matters, and the answer where one is allowed. */
export const FlagNote = ({ flag, explain }: Props) => {
  const { store, readOnly } = useDeskTools();
  const answer = useDesk((state) =>
    state.answers.find((one) => flag.answerable && one.flag === flagKey(flag)),
  );
  const isCurrent = useDesk((state) => state.flag === flagId(flag));
  const [shown, setShown] = useState<'why' | 'answer' | null>(null);
  const rule = explain(flag.rule);
  const toggle = (what: 'why' | 'answer') => setShown((now) => (now === what ? null : what));
  const isDone = answer !== undefined && isAnswered(flag, [answer]);
  return (
    <li
      id={flagId(flag)}
      className={`note note-${flag.level}`}
      data-answered={isDone || undefined}
      data-current={isCurrent || undefined}
    >
      <p className="note-level">{isDone ? `${flag.level}, answered` : flag.level}</p>
      <p className="note-message">{flag.message}</p>
      {isDone && (
        <p className="note-reason">
          “{answer.reason}”{answer.by === '' ? '' : ` · ${answer.by}`}
        </p>
      )}
      <p className="note-links">
        {flag.fields.slice(0, isDone ? 0 : 2).map((path) => (
          <button key={path} type="button" className="case-link" onClick={() => goToField(store, path)}>
            {fieldLabel(path)}
          </button>
        ))}
        {rule !== undefined && (
          <button
            type="button"
            className="case-link"
            aria-expanded={shown === 'why'}
            data-key="why"
            onClick={() => toggle('why')}
          >
            Why
          </button>
        )}
        {flag.answerable && !isDone && !readOnly && (
          <button
            type="button"
            className="case-link"
            aria-expanded={shown === 'answer'}
            data-key="answer"
            onClick={() => toggle('answer')}
          >
            Answer
          </button>
        )}
        {isDone && !readOnly && (
          <button type="button" className="case-link" onClick={() => store.answer(flag, '')}>
            Take back
          </button>
        )}
      </p>
      {shown === 'why' && rule !== undefined && (
        <p className="note-why">
          {rule.why} <cite>{rule.source}</cite>
        </p>
      )}
      {shown === 'answer' && <AnswerForm flag={flag} onDone={() => setShown(null)} />}
    </li>
  );
};
