import { lazy, type PointerEvent, Suspense, useEffect, useMemo, useState } from 'react';
import type { UnitView } from '../../domain/api.ts';
import type { FieldPath } from '../../domain/record/paths.ts';
import { showDate } from '../ui/entry.ts';
import { SheetPaper } from './SheetPaper.tsx';
import { takeDrafted } from './sheet-doc.ts';
import { statementMarks } from './statement-marks.ts';
import { useDesk, useDeskTools } from './use-desk.ts';

const SheetEditor = lazy(() => import('./SheetEditor.tsx'));

const Letterhead = ({ unit }: { unit: UnitView }) => {
  const who = useDesk((state) => state.record.who);
  const patient = who?.patient;
  const name = [patient?.familyName, patient?.givenName].filter((part) => part !== undefined).join(', ');
  const born = patient?.dateOfBirth === undefined ? '' : `born ${showDate(patient.dateOfBirth)}`;
  const day = who?.startedAt === undefined ? '' : showDate(who.startedAt);
  const side = who?.eye === undefined ? '' : `${who.eye} eye`;
  const join = (...parts: (string | undefined)[]) => parts.filter((part) => (part ?? '') !== '').join(' · ');
  return (
    <header className="sheet-head">
      <p>
        {unit.name}
        <br />
        {unit.service}
      </p>
      <p className="text-right">
        {join(name, born)}
        <br />
        {join(patient?.number, side, day)}
      </p>
    </header>
  );
};

const StillSheet = () => {
  const { store } = useDeskTools();
  const sheet = useDesk((state) => state.sheet);
  return <SheetPaper sheet={sheet} marks={statementMarks(store.get())} />;
};

const numbered = (rows: readonly string[][]) => rows.map((cells, index) => ({ cells, number: index + 1 }));

const Tables = () => {
  const tables = useDesk((state) => state.tables);
  return tables.map((table) => (
    <section key={table.id} className="sheet-section">
      <h3>{table.heading}</h3>
      <div className="fit">
        <table className="sheet-table">
          <thead>
            <tr>
              {table.columns.map((column) => (
                <th key={column} scope="col">
                  {column}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {numbered(table.rows).map(({ cells, number }) => (
              <tr key={number}>
                {table.columns.map((column, index) => (
                  <td key={column}>{cells[index]}</td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  ));
};

const useFactsOfStatements = () => {
  const { store } = useDeskTools();
  return useMemo(() => {
    let last = '';
    return (event: PointerEvent) => {
      const element = event.target instanceof Element ? event.target.closest('[data-statement]') : null;
      const id = element?.getAttribute('data-statement') ?? '';
      if (id === last) return;
      last = id;
      const found = store
        .get()
        .sheet.sections.flatMap((section) => section.statements)
        .find((statement) => statement.id === id);
      const reads: readonly FieldPath[] | null = found?.reads ?? null;
      store.light(reads);
    };
  }, [store]);
};

const TakenOut = () => {
  const { store, readOnly } = useDeskTools();
  const sheet = useDesk((state) => state.sheet);
  const taken = sheet.sections
    .flatMap((section) => section.statements)
    .filter((statement) => statement.origin === 'deleted' && statement.drafted !== '');
  if (taken.length === 0 || readOnly) return null;
  return (
    <details className="sheet-taken no-print">
      <summary>
        {taken.length === 1 ? '1 statement taken out' : `${taken.length} statements taken out`}
      </summary>
      <ul>
        {taken.map((statement) => (
          <li key={statement.id}>
            {statement.drafted}{' '}
            <button
              type="button"
              className="case-link"
              onClick={() => store.editSheet(takeDrafted(store.get().sheet, statement.id))}
            >
              put back
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
};

/** The sheet: the note as it will be read, on white paper. */
export const SheetPane = ({ unit }: { unit: UnitView }) => {
  const { store, readOnly } = useDeskTools();
  const title = useDesk((state) => state.sheet.title);
  const isEmpty = useDesk((state) =>
    state.sheet.sections.every((section) => section.statements.length === 0),
  );
  const [mounted, setMounted] = useState(false);
  const rest = useFactsOfStatements();
  useEffect(() => setMounted(true), []);
  return (
    <article
      className="sheet"
      aria-label="Sheet"
      onPointerOver={rest}
      onPointerLeave={() => store.light(null)}
    >
      <Letterhead unit={unit} />
      <h2>{title}</h2>
      {isEmpty && <p className="sheet-hint no-print">The note is drafted here as the record grows.</p>}
      {mounted && !readOnly ? (
        <Suspense fallback={<StillSheet />}>
          <SheetEditor />
        </Suspense>
      ) : (
        <StillSheet />
      )}
      <Tables />
      <TakenOut />
    </article>
  );
};
