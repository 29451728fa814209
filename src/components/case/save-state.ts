import type { CaseView } from '../../domain/api.ts';

/** How the keeping of this case stands. Nothing that was typed leaves the page in any of these states. */
export type SaveState =
  | { kind: 'saved'; at: string }
  | { kind: 'waiting' }
  | { kind: 'saving' }
  | { kind: 'failed'; code: string; message: string; retrying: boolean }
  | { kind: 'stale'; theirs: CaseView };

const time = (instant: string) =>
  new Date(instant).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });

/** The state in the words of the patient bar. */
export const saveInWords = (state: SaveState): string => {
  switch (state.kind) {
    case 'saved':
      return `saved ${time(state.at)}`;
    case 'waiting':
      return 'not saved yet';
    case 'saving':
      return 'saving';
    case 'failed':
      return state.retrying ? 'not saved, trying again' : 'not saved';
    case 'stale':
      return 'changed elsewhere';
  }
};
