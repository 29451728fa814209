import { type FocusEvent, type KeyboardEvent, useRef } from 'react';
import { fieldTree, stageTitle } from '../../domain/record/field-tree.ts';
import { stages } from '../../domain/record/schema.ts';
import { Key } from '../ui/Key.tsx';
import { Group } from './Group.tsx';
import { goToStage } from './go-to-field.ts';
import { Pictures } from './Pictures.tsx';
import { StageList } from './StageList.tsx';
import { useDesk, useDeskTools } from './use-desk.ts';

const boxes = 'input, select';
const stops = 'input:not(:disabled, [tabindex="-1"]), select:not(:disabled), textarea, button:not(:disabled)';

/** Enter goes on to the next field, as Tab does; a row of buttons is one stop. */
const goOn = (form: HTMLElement, from: HTMLElement) => {
  const all = [...form.querySelectorAll<HTMLElement>(stops)];
  const group = from.closest('[role="radiogroup"], .case-toggles');
  const rest = all
    .slice(all.indexOf(from) + 1)
    .filter((element) => group === null || !group.contains(element));
  const next = rest[0];
  const checked = next?.closest('[role="radiogroup"]')?.querySelector<HTMLElement>('input:checked');
  (checked ?? next)?.focus();
};

/** The facts: the stages, the globe laid flat, and the fields of the stage in hand. */
export const RecordPane = () => {
  const { store, readOnly } = useDeskTools();
  const stage = useDesk((state) => state.stage);
  const form = useRef<HTMLFormElement>(null);
  const spec = fieldTree.find((field) => field.name === stage);
  const place = stages.indexOf(stage);
  const next = stages[place + 1];

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Enter' || !(event.target instanceof HTMLElement) || form.current === null) return;
    if (!event.target.matches(boxes)) return;
    event.preventDefault();
    goOn(form.current, event.target);
  };
  const onFocus = (event: FocusEvent) =>
    store.focusOn(event.target.closest('[data-path]')?.getAttribute('data-path') ?? null);

  return (
    <div className="record">
      <StageList />
      <div className="record-stage">
        <Pictures />
        <h2 id="stage-title" tabIndex={-1}>
          {stageTitle(stage)}
        </h2>
        <form
          ref={form}
          className="record-fields"
          key={stage}
          aria-labelledby="stage-title"
          onSubmit={(event) => event.preventDefault()}
          onKeyDown={onKeyDown}
          onFocus={onFocus}
          onBlur={() => store.focusOn(null)}
        >
          {spec?.kind === 'group' && <Group fields={spec.fields} path={stage} />}
          {!readOnly && next !== undefined && (
            <button type="button" className="case-next" onClick={() => goToStage(store, next)}>
              Go on: {stageTitle(next).toLowerCase()} <Key>G</Key>
            </button>
          )}
        </form>
      </div>
    </div>
  );
};
