import { useCallback, useEffect, useRef, useState } from 'react';
import type { Sheet, Statement } from '../../domain/drafting/sheet.ts';
import { readProse } from '../../domain/prose/read.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';

export interface ReaderOption {
  id: string;
  name: string;
  practice: string;
  address: string;
  email: string;
  isConfirmed: boolean;
  /** Why it is suggested: the record names this reader. */
  isNamed: boolean;
}

interface Props {
  id: string;
  revision: number;
  state: 'waiting' | 'failed' | 'queued' | 'sent';
  lastError: string | null;
  sentAt: string | null;
  sheet: Sheet;
  record: CaseRecord;
  recipientId: string | null;
  readers: ReaderOption[];
  maySend: boolean;
}

interface Answer {
  ok: boolean;
  body: { message?: string; revision?: number; state?: Props['state']; lastError?: string | null };
}

const ask = async (address: string, method: string, revision?: number, body?: unknown): Promise<Answer> => {
  try {
    const response = await fetch(address, {
      method,
      headers: {
        'content-type': 'application/json',
        ...(revision === undefined ? {} : { 'if-match': `"${revision}"` }),
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    return { ok: response.ok, body: await response.json() };
  } catch {
    return {
      ok: false,
      body: { message: 'The server cannot be reached. Leave this page open and try again.' },
    };
  }
};

const withText = (sheet: Sheet, id: string, text: string): Sheet => ({
  ...sheet,
  sections: sheet.sections.map((section) => ({
    ...section,
    statements: section.statements.map((one): Statement => {
      if (one.id !== id) return one;
      if (text === one.drafted) return { ...one, origin: 'drafted', text };
      return text.trim() === ''
        ? { ...one, origin: 'deleted', text: '' }
        : { ...one, origin: 'edited', text };
    }),
  })),
});

const StatementBox = ({
  statement,
  record,
  isOpen,
  onText,
}: {
  statement: Statement;
  record: CaseRecord;
  isOpen: boolean;
  onText: (text: string) => void;
}) => {
  const [text, setText] = useState(statement.text);
  const denied = statement.origin === 'drafted' ? [] : readProse(text, record);
  const hint = `denied-${statement.id}`;
  if (!isOpen) return <p className="my-1">{statement.text}</p>;
  return (
    <div className="my-1">
      <textarea
        aria-label="Statement"
        aria-describedby={denied.length > 0 ? hint : undefined}
        aria-invalid={denied.length > 0}
        className="letter-words"
        rows={1}
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          onText(event.target.value);
        }}
      />
      {denied.length > 0 && (
        <p id={hint} className="error font-sans">
          {denied.map(({ words, recorded }) => `“${words}”: the signed note says ${recorded}.`).join(' ')}
        </p>
      )}
    </div>
  );
};

const states = {
  waiting: 'To be prepared and sent.',
  queued: 'On its way. This page shows when it has gone.',
  sent: 'Sent.',
  failed: 'Not sent.',
} as const;

/** One letter: its words, its reader, and its way. */
export const LetterPage = (props: Props) => {
  const { id, record, readers, maySend } = props;
  const [sheet, setSheet] = useState(props.sheet);
  const [recipientId, setRecipientId] = useState(props.recipientId);
  const [state, setState] = useState(props.state);
  const [lastError, setLastError] = useState(props.lastError);
  const [message, setMessage] = useState('');
  const [saved, setSaved] = useState(true);
  const revision = useRef(props.revision);
  const running = useRef<Promise<boolean>>(Promise.resolve(true));
  const isOpen = state === 'waiting' || state === 'failed';
  const latest = useRef({ sheet, recipientId });
  latest.current = { sheet, recipientId };

  const save = useCallback((): Promise<boolean> => {
    running.current = running.current.then(async () => {
      const { ok, body } = await ask(`/api/letters/${id}`, 'PUT', revision.current, latest.current);
      if (ok && body.revision !== undefined) revision.current = body.revision;
      setMessage(ok ? '' : (body.message ?? ''));
      setSaved(ok);
      return ok;
    });
    return running.current;
  }, [id]);

  useEffect(() => {
    if (saved || !isOpen) return;
    const timer = setTimeout(() => void save(), 800);
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => {
      clearTimeout(timer);
      window.removeEventListener('beforeunload', warn);
    };
  }, [saved, isOpen, save]);

  useEffect(() => {
    if (state !== 'queued') return;
    const timer = setInterval(async () => {
      const { ok, body } = await ask(`/api/letters/${id}`, 'GET');
      if (!ok || body.state === undefined) return;
      setState(body.state);
      setLastError(body.lastError ?? null);
    }, 1500);
    return () => clearInterval(timer);
  }, [state, id]);

  const change = (next: { sheet?: Sheet; recipientId?: string | null }) => {
    if (next.sheet !== undefined) setSheet(next.sheet);
    if (next.recipientId !== undefined) setRecipientId(next.recipientId);
    setSaved(false);
  };

  const send = async () => {
    if (!saved && !(await save())) return;
    const { ok, body } = await ask(`/api/letters/${id}/send`, 'POST', revision.current);
    if (ok) setState('queued');
    setMessage(ok ? '' : (body.message ?? ''));
  };

  const statements = sheet.sections.flatMap((section) => section.statements);
  const isDenied = statements.some(
    ({ origin, text }) => origin !== 'drafted' && origin !== 'deleted' && readProse(text, record).length > 0,
  );
  const reader = readers.find((one) => one.id === recipientId);
  const blocked = isDenied
    ? 'Send: words against the signed note first'
    : reader === undefined
      ? 'Send: choose the reader first'
      : reader.isConfirmed
        ? ''
        : 'Send: confirm the address first';

  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-6 lg:grid-cols-[minmax(0,1fr)_20rem]">
      <article className="border border-rule bg-sheet p-8 font-serif leading-relaxed" aria-label="Letter">
        {sheet.sections.map((section) => (
          <section key={section.id} className="mb-4">
            {section.id !== 'salutation' && <h2 className="text-base">{section.heading}</h2>}
            {section.statements
              .filter((statement) => isOpen || statement.origin !== 'deleted')
              .map((statement) => (
                <StatementBox
                  key={statement.id}
                  statement={statement}
                  record={record}
                  isOpen={isOpen}
                  onText={(text) => change({ sheet: withText(sheet, statement.id, text) })}
                />
              ))}
          </section>
        ))}
      </article>
      <aside className="flex flex-col gap-4" aria-label="Sending">
        <p
          className={`notice ${state === 'failed' ? 'notice-bad' : state === 'sent' ? 'notice-good' : ''}`}
          role="status"
        >
          <strong>{states[state]}</strong>
          {lastError !== null && ` ${lastError}`}
        </p>
        <fieldset disabled={!isOpen}>
          <legend className="label">Goes to</legend>
          {readers.map((one) => (
            <label key={one.id} className="mt-2 flex gap-3">
              <input
                type="radio"
                name="reader"
                className="mt-1 size-5 shrink-0 accent-cloth"
                checked={recipientId === one.id}
                onChange={() => change({ recipientId: one.id })}
              />
              <span>
                {one.name}, {one.practice}
                <span className="block text-sm text-soft">
                  {one.address}
                  <br />
                  {one.email}
                </span>
                {one.isNamed && (
                  <span className="block text-sm font-semibold text-cloth">named in the record</span>
                )}
                {!one.isConfirmed && (
                  <span className="block text-sm font-semibold text-ochre">address not confirmed</span>
                )}
              </span>
            </label>
          ))}
          {readers.length === 0 && <p>The directory is empty.</p>}
          <p className="mt-3">
            <a href="/recipients">Directory</a>
          </p>
        </fieldset>
        {message !== '' && (
          <p className="notice notice-bad" role="alert">
            {message}
          </p>
        )}
        <p aria-live="polite" className="text-soft">
          {isOpen ? (saved ? 'saved' : 'saving…') : ''}
        </p>
        <p>
          <a href={`/api/letters/${id}/letter.docx`}>
            {isOpen ? 'Look at the document' : 'The document that was sent'}
          </a>
        </p>
        {isOpen && maySend && (
          <button type="button" className="button" disabled={blocked !== ''} onClick={() => void send()}>
            {blocked === '' ? (state === 'failed' ? 'Try again' : 'Send') : blocked}
          </button>
        )}
      </aside>
    </div>
  );
};
