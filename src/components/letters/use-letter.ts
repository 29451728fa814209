import { useCallback, useEffect, useRef, useState } from 'react';
import type { LetterView, SaveLetter, SendLetter } from '../../domain/letters/api.ts';
import { type Failure, ok, type Result } from '../../domain/result.ts';
import { keepLetter, readLetter, sendLetter } from './letter-api.ts';

const PAUSE_MS = 800;
const AGAIN_MS = 3000;
const ASK_MS = 2000;
/** Refusals that go by without anything being changed on the page. */
const passing: ReadonlySet<string> = new Set(['offline', 'failed', 'sign-in-needed']);

const contentOf = ({ sheet, recipientId }: LetterView): SaveLetter => ({ sheet, recipientId });

/** One letter at the desk: what stands in it, whether that is kept, and how far it is on its way. */
export const useLetter = (id: string, first: LetterView) => {
  const [view, setView] = useState(first);
  const [content, setContent] = useState(() => contentOf(first));
  const [kept, setKept] = useState(content);
  const [failure, setFailure] = useState<Failure | null>(null);
  const [theirs, setTheirs] = useState<LetterView | null>(null);
  const [sending, setSending] = useState(false);
  const revision = useRef(first.revision);
  const latest = useRef(content);
  latest.current = content;
  const keptNow = useRef(content);
  const refused = useRef<SaveLetter | null>(null);
  const turn = useRef<Promise<unknown>>(Promise.resolve());
  const isOpen = view.state === 'waiting' || view.state === 'failed';
  const isKept = kept === content;

  const acceptAsKept = useCallback((now: SaveLetter) => {
    keptNow.current = now;
    setKept(now);
  }, []);

  /** One save after the other; what is typed while one is under way is not yet kept. */
  const save = useCallback((): Promise<Result<null>> => {
    const next = turn.current.then(async (): Promise<Result<null>> => {
      const now = latest.current;
      if (now === keptNow.current) return ok(null);
      const answer = await keepLetter(id, revision.current, now);
      if (answer.ok) {
        revision.current = answer.value.revision;
        acceptAsKept(now);
        setFailure(null);
        return ok(null);
      }
      refused.current = now;
      setFailure(answer.error);
      if (answer.error.code === 'stale' || answer.error.code === 'not-waiting') {
        const read = await readLetter(id);
        if (read.ok) {
          setView(read.value);
          if (answer.error.code === 'stale') setTheirs(read.value);
        }
      }
      return answer;
    });
    turn.current = next;
    return next;
  }, [id, acceptAsKept]);

  const isPassing = failure !== null && passing.has(failure.code);
  useEffect(() => {
    if (content === kept || !isOpen || theirs !== null) return;
    // What was refused is sent again only when it has changed; what could not be sent, by itself.
    if (failure !== null && !isPassing && refused.current === content) return;
    const timer = setTimeout(() => void save(), isPassing ? AGAIN_MS : PAUSE_MS);
    return () => clearTimeout(timer);
  }, [content, kept, failure, isPassing, isOpen, theirs, save]);

  useEffect(() => {
    if (isKept || !isOpen) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [isKept, isOpen]);

  useEffect(() => {
    if (view.state !== 'queued') return;
    const timer = setInterval(async () => {
      const read = await readLetter(id);
      if (!read.ok) return;
      setView(read.value);
      revision.current = read.value.revision;
    }, ASK_MS);
    return () => clearInterval(timer);
  }, [view.state, id]);

  /** Keeps what is on the page, then sends exactly that. */
  const send = async (by: SendLetter['by']): Promise<void> => {
    setSending(true);
    while (latest.current !== keptNow.current) {
      const saved = await save();
      if (!saved.ok) return setSending(false);
    }
    const answer = await sendLetter(id, revision.current, by);
    setFailure(answer.ok ? null : answer.error);
    const read = await readLetter(id);
    if (read.ok) setView(read.value);
    setSending(false);
  };

  const settle = (with_: 'mine' | 'theirs'): void => {
    if (theirs === null) return;
    revision.current = theirs.revision;
    if (with_ === 'theirs') {
      const now = contentOf(theirs);
      setContent(now);
      latest.current = now;
      acceptAsKept(now);
    }
    setTheirs(null);
    setFailure(null);
  };

  return { view, content, setContent, isOpen, isKept, failure, theirs, settle, send, sending };
};
