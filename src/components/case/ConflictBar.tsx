import { useState } from 'react';
import type { CaseView } from '../../domain/api.ts';
import { Dialog } from '../ui/Dialog.tsx';
import type { Content } from './desk-store.ts';
import { differences } from './differences.ts';
import type { Autosave } from './use-autosave.ts';
import { useDeskTools } from './use-desk.ts';

const Comparison = ({ theirs, onClose }: { theirs: CaseView; onClose: () => void }) => {
  const { store } = useDeskTools();
  const found = differences(store.get(), theirs);
  return (
    <Dialog title="What the two versions say differently" onClose={onClose}>
      {found.length === 0 ? (
        <p>They say the same.</p>
      ) : (
        <table className="table">
          <thead>
            <tr>
              <th scope="col">What</th>
              <th scope="col">Here</th>
              <th scope="col">There</th>
            </tr>
          </thead>
          <tbody>
            {found.map((difference) => (
              <tr key={`${difference.label} ${difference.mine} ${difference.theirs}`}>
                <th scope="row">{difference.label}</th>
                <td>{difference.mine}</td>
                <td>{difference.theirs}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </Dialog>
  );
};

/** Says that somebody saved another version, and offers both. Neither is lost. */
export const ConflictBar = ({ autosave }: { autosave: Autosave }) => {
  const { store } = useDeskTools();
  const [comparing, setComparing] = useState(false);
  const [mine, setMine] = useState<Content | null>(null);
  const { state } = autosave;

  if (state.kind === 'stale') {
    const { theirs } = state;
    return (
      <div className="case-bar" role="status">
        <span>
          This case was saved elsewhere as revision {theirs.revision}. What you wrote is still here, and not
          saved.
        </span>
        <button type="button" className="case-link" onClick={() => setComparing(true)}>
          See the differences
        </button>
        <button type="button" className="case-link" onClick={() => autosave.keepMine(theirs)}>
          Keep mine
        </button>
        <button
          type="button"
          className="case-link"
          onClick={() => {
            const { record, sheet, answers } = store.get();
            setMine({ record, sheet, answers });
            autosave.takeTheirs(theirs);
          }}
        >
          Take theirs
        </button>
        {comparing && <Comparison theirs={theirs} onClose={() => setComparing(false)} />}
      </div>
    );
  }
  if (state.kind === 'failed') {
    return (
      <div className="case-bar" role="status">
        <span>{state.message}</span>
        <button type="button" className="case-link" onClick={() => autosave.save()}>
          Save now
        </button>
        {state.code === 'sign-in-needed' && (
          <a href="/sign-in" target="_blank" rel="noreferrer">
            Sign in again in another tab
          </a>
        )}
      </div>
    );
  }
  if (mine === null) return null;
  return (
    <div className="case-bar" role="status">
      <span>The other version is shown. Yours is kept on this page until you leave it.</span>
      <button
        type="button"
        className="case-link"
        onClick={() => {
          store.replace(mine, true);
          setMine(null);
        }}
      >
        Back to mine
      </button>
      <button type="button" className="case-link" onClick={() => setMine(null)}>
        Let mine go
      </button>
    </div>
  );
};
