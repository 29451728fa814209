import type { Statement } from '../../domain/drafting/sheet.ts';
import { keepEdited, takeDrafted } from './sheet-doc.ts';
import { useDeskTools } from './use-desk.ts';

/** An edited statement whose facts have changed since: what the facts say now, to take or to leave. */
export const PartedNote = ({ statement }: { statement: Statement }) => {
  const { store } = useDeskTools();
  return (
    <li id={`parted:${statement.id}`} className="note note-parted">
      <p className="note-level">Facts changed</p>
      <p className="note-message">
        {statement.drafted === '' ? 'The record no longer says this.' : `Now: “${statement.drafted}”`}
      </p>
      <p className="note-links">
        <button
          type="button"
          className="case-link"
          data-key="take"
          onClick={() => store.editSheet(takeDrafted(store.get().sheet, statement.id))}
        >
          {statement.drafted === '' ? 'Take it out' : 'Take the new'} <kbd className="key">T</kbd>
        </button>
        <button
          type="button"
          className="case-link"
          data-key="keep"
          onClick={() => store.editSheet(keepEdited(store.get().sheet, statement.id))}
        >
          Keep yours <kbd className="key">K</kbd>
        </button>
      </p>
    </li>
  );
};
