import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { CaseSigned, CaseView, UnitView } from '../../domain/api.ts';
import type { Settings } from '../../domain/checks/engine.ts';
import { BottomBar, blockedBy } from './BottomBar.tsx';
import { ConflictBar } from './ConflictBar.tsx';
import { deriversFor } from './derive.ts';
import { createDeskStore, type Pane, panes } from './desk-store.ts';
import { KeysDialog } from './KeysDialog.tsx';
import { Margin } from './Margin.tsx';
import { PatientBar } from './PatientBar.tsx';
import { pageKeys, pressPageKey } from './page-keys.ts';
import { RecordPane } from './RecordPane.tsx';
import { SheetPane } from './SheetPane.tsx';
import { SignDialog } from './SignDialog.tsx';
import { SignedBar } from './SignedBar.tsx';
import { useAutosave } from './use-autosave.ts';
import { type Desk, DeskContext, useDesk, useDeskTools } from './use-desk.ts';

interface Props {
  view: CaseView;
  unit: UnitView;
  /** Today at the unit, YYYY-MM-DD. */
  today: string;
  mayWrite: boolean;
  /** What the unit has settled about its cautions. */
  settings: Settings;
  signed: CaseSigned | null;
}

interface DeskProps extends Props {
  onSigned: (signed: CaseSigned) => void;
}

const paneTitles: Readonly<Record<Pane, string>> = { record: 'Record', sheet: 'Sheet', margin: 'Margin' };

const pad = (value: number) => String(value).padStart(2, '0');

const localNow = () => {
  const now = new Date();
  const day = `${now.getFullYear()}-${pad(now.getMonth() + 1)}-${pad(now.getDate())}`;
  return `${day}T${pad(now.getHours())}:${pad(now.getMinutes())}`;
};

const PaneTabs = () => {
  const { store } = useDeskTools();
  const shown = useDesk((state) => state.pane);
  return (
    <nav className="pane-tabs" aria-label="Views">
      {panes.map((pane) => (
        <button key={pane} type="button" aria-pressed={shown === pane} onClick={() => store.show(pane)}>
          {paneTitles[pane]}
        </button>
      ))}
    </nav>
  );
};

const CaseDesk = ({ view, unit, today, signed, onSigned }: DeskProps) => {
  const { store, readOnly } = useDeskTools();
  const pane = useDesk((state) => state.pane);
  const autosave = useAutosave(store, view, !readOnly);
  const [panel, setPanel] = useState<'keys' | 'sign' | null>(null);
  const desk = useRef<HTMLDivElement>(null);

  const actions = useMemo(
    () => ({
      save: () => void autosave.save(),
      sign: () => {
        if (!readOnly && blockedBy(store.get()) === '') setPanel('sign');
        else pageKeys.find(({ printed }) => printed === 'N')?.run(store, actions, 'KeyN');
      },
      help: () => setPanel('keys'),
    }),
    [autosave.save, readOnly, store],
  );

  const press = useCallback(
    (code: string) => pageKeys.find(({ codes }) => codes.includes(code))?.run(store, actions, code),
    [store, actions],
  );

  useEffect(() => {
    if (panel !== null) return;
    const onKey = (event: KeyboardEvent) => {
      if (!event.defaultPrevented && pressPageKey(event, store, actions)) event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [store, actions, panel]);

  return (
    <div className="case-page" data-pane={pane}>
      <PatientBar
        revision={autosave.revision}
        save={autosave.state}
        today={today}
        signed={signed !== null}
        history={`/cases/${view.id}/history`}
      />
      <ConflictBar autosave={autosave} />
      {signed !== null && <SignedBar signed={signed} />}
      <PaneTabs />
      <div className="case-columns">
        <RecordPane />
        <div className="desk" ref={desk}>
          <SheetPane unit={unit} />
          <Margin desk={desk} />
        </div>
      </div>
      <BottomBar press={press} onSign={actions.sign} />
      {panel === 'keys' && <KeysDialog onClose={() => setPanel(null)} />}
      {panel === 'sign' && (
        <SignDialog
          id={view.id}
          autosave={autosave}
          onClose={() => setPanel(null)}
          onSigned={(result) => {
            setPanel(null);
            onSigned(result);
          }}
        />
      )}
    </div>
  );
};

/** The case page: record, sheet and margin side by side, drafted and checked at every key. */
export const CasePage = (props: Props) => {
  const { view, mayWrite } = props;
  const [signed, setSigned] = useState(props.signed);
  const [client] = useState(() => new QueryClient());
  const [store] = useState(() => createDeskStore({ ...view, stage: 'who' }, deriversFor(props.settings)));
  const readOnly = !mayWrite || view.state === 'signed' || signed !== null;
  const tools: Desk = useMemo(() => ({ store, readOnly, now: localNow }), [store, readOnly]);
  return (
    <QueryClientProvider client={client}>
      <DeskContext value={tools}>
        <CaseDesk {...props} signed={signed} onSigned={setSigned} />
      </DeskContext>
    </QueryClientProvider>
  );
};
