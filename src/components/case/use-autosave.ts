import { useMutation } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { CaseView } from '../../domain/api.ts';
import { putCase, Refusal } from './case-api.ts';
import type { DeskStore } from './desk-store.ts';
import type { SaveState } from './save-state.ts';

const quiet = 800;
const longestWait = 30_000;
/** Refusals that go away by themselves. */
const passing = ['offline', 'failed', 'too-many-attempts'];

const codeOf = (error: Error) => (error instanceof Refusal ? error.answer.code : 'failed');

const isPassing = (error: Error) => passing.includes(codeOf(error));

/** Keeps the case on the server without being asked, one save after another, each upon the revision before. */
export const useAutosave = (store: DeskStore, view: CaseView, enabled: boolean) => {
  const revision = useRef(view.revision);
  const savedEdits = useRef(0);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const busy = useRef<Promise<boolean> | null>(null);
  const [state, setState] = useState<SaveState>({ kind: 'saved', at: view.savedAt });
  const [shownRevision, setShownRevision] = useState(view.revision);

  const { mutateAsync } = useMutation({
    mutationFn: async () => {
      const { record, sheet, answers, edits } = store.get();
      const body = { record, sheet, answers: answers.map(({ flag, reason }) => ({ flag, reason })) };
      return { saved: await putCase(view.id, revision.current, body), edits };
    },
    networkMode: 'always',
    retry: (_, error) => {
      if (!isPassing(error)) return false;
      setState({ kind: 'failed', code: codeOf(error), message: error.message, retrying: true });
      return true;
    },
    retryDelay: (attempt) => Math.min(1000 * 2 ** attempt, longestWait),
    onError: (error) => {
      const answer = error instanceof Refusal ? error.answer : null;
      if (answer?.code === 'stale' && answer.current !== undefined) {
        setState({ kind: 'stale', theirs: answer.current });
      } else setState({ kind: 'failed', code: codeOf(error), message: error.message, retrying: false });
    },
  });

  const save = useCallback(async (): Promise<boolean> => {
    clearTimeout(timer.current);
    if (busy.current !== null) await busy.current;
    if (store.get().edits === savedEdits.current) return true;
    const run = async () => {
      setState({ kind: 'saving' });
      try {
        const { saved, edits } = await mutateAsync();
        revision.current = saved.revision;
        savedEdits.current = edits;
        setShownRevision(saved.revision);
        store.answersKept(saved.answers);
        setState(store.get().edits === edits ? { kind: 'saved', at: saved.savedAt } : { kind: 'waiting' });
        return true;
      } catch {
        return false;
      } finally {
        busy.current = null;
      }
    };
    busy.current = run();
    return busy.current;
  }, [store, mutateAsync]);

  useEffect(() => {
    if (!enabled) return;
    let seen = store.get().edits;
    return store.subscribe(() => {
      const { edits } = store.get();
      if (edits === seen) return;
      seen = edits;
      if (edits === savedEdits.current) return;
      setState((now) => {
        if (now.kind === 'stale') return now;
        clearTimeout(timer.current);
        timer.current = setTimeout(save, quiet);
        return now.kind === 'saving' || now.kind === 'failed' ? now : { kind: 'waiting' };
      });
    });
  }, [store, save, enabled]);

  useEffect(() => {
    const warn = (event: BeforeUnloadEvent) => {
      if (store.get().edits !== savedEdits.current) event.preventDefault();
    };
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [store]);

  return useMemo(
    () => ({
      state,
      revision: shownRevision,
      /** The revision that the next change is made upon. */
      revisionNow: () => revision.current,
      save,
      /** Saves this page's version upon the other one's revision. */
      keepMine: (theirs: CaseView) => {
        revision.current = theirs.revision;
        setState({ kind: 'waiting' });
        return save();
      },
      /** Goes on from the other version. */
      takeTheirs: (theirs: CaseView) => {
        revision.current = theirs.revision;
        setShownRevision(theirs.revision);
        store.replace(theirs, false);
        savedEdits.current = store.get().edits;
        setState({ kind: 'saved', at: theirs.savedAt });
      },
    }),
    [state, shownRevision, save, store],
  );
};

export type Autosave = ReturnType<typeof useAutosave>;
