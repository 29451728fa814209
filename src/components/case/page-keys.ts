import { type FieldPath, valueAt } from '../../domain/record/paths.ts';
import { stages } from '../../domain/record/schema.ts';
import { type DeskStore, flagId, panes } from './desk-store.ts';
import { nextEmpty } from './field-order.ts';
import { openFlags } from './flag-order.ts';
import { goToField, goToStage } from './go-to-field.ts';

/** What the keys do that the page alone cannot. */
export interface PageActions {
  save: () => void;
  sign: () => void;
  help: () => void;
}

interface PageKey {
  /** As `KeyboardEvent.code` names it. */
  codes: readonly string[];
  printed: string;
  does: string;
  run: (store: DeskStore, actions: PageActions, code: string) => void;
}

/** The flag after the one that was gone to last, worst first, and round again. */
const goToNextFlag = (store: DeskStore) => {
  const { flags, answers, flag } = store.get();
  const open = openFlags(flags, answers);
  const next = open[(open.findIndex((one) => flagId(one) === flag) + 1) % Math.max(1, open.length)];
  if (next === undefined) return;
  store.goToFlag(next);
  document.getElementById(flagId(next))?.scrollIntoView({ block: 'nearest' });
  const field = next.fields[0];
  if (field !== undefined) goToField(store, field);
};

const goToEmpty = (store: DeskStore, from: FieldPath | null) => {
  const next = nextEmpty(store.get().record, from ?? store.get().stage);
  if (next !== null) goToField(store, next);
};

const pressIn = (within: Element | null | undefined, key: string) =>
  within?.querySelector<HTMLElement>(`[data-key="${key}"]`)?.click();

const currentNote = (store: DeskStore) => {
  const { flag } = store.get();
  return flag === null ? null : document.getElementById(flag);
};

const partedNote = () => document.querySelector('.note-parted');

const factsOfStatement = (store: DeskStore) => {
  const { lit, record } = store.get();
  const path = lit.find((one) => valueAt(record, one) !== undefined) ?? lit[0];
  if (path !== undefined) goToField(store, path);
};

const goOn = (store: DeskStore) => {
  const next = stages[stages.indexOf(store.get().stage) + 1];
  if (next !== undefined) goToStage(store, next);
};

const stageCodes = [...'1234567890'].map((digit) => `Digit${digit}`).concat('Minus');

export const pageKeys: readonly PageKey[] = [
  { codes: ['KeyN'], printed: 'N', does: 'next flag, worst first', run: goToNextFlag },
  {
    codes: ['KeyW'],
    printed: 'W',
    does: 'why: the reason behind that flag',
    run: (store) => pressIn(currentNote(store), 'why'),
  },
  {
    codes: ['KeyA'],
    printed: 'A',
    does: 'answer that flag with a reason',
    run: (store) => pressIn(currentNote(store), 'answer'),
  },
  {
    codes: ['KeyE'],
    printed: 'E',
    does: 'next empty field',
    run: (store) => goToEmpty(store, store.get().field),
  },
  { codes: ['KeyG'], printed: 'G', does: 'go on to the next stage', run: goOn },
  {
    codes: stageCodes,
    printed: '1 … 9, 0, -',
    does: 'the eleven stages',
    run: (store, _, code) => {
      const stage = stages[stageCodes.indexOf(code)];
      if (stage !== undefined) goToStage(store, stage);
    },
  },
  { codes: ['KeyF'], printed: 'F', does: 'from a sentence to its facts', run: factsOfStatement },
  {
    codes: ['KeyT'],
    printed: 'T',
    does: 'take the new words of a sentence whose facts changed',
    run: () => pressIn(partedNote(), 'take'),
  },
  { codes: ['KeyK'], printed: 'K', does: 'keep your words', run: () => pressIn(partedNote(), 'keep') },
  {
    codes: ['KeyM'],
    printed: 'M',
    does: 'into the sheet, to write',
    run: (store) => {
      store.show('sheet');
      requestAnimationFrame(() => document.querySelector<HTMLElement>('.sheet [role="textbox"]')?.focus());
    },
  },
  {
    codes: ['KeyV'],
    printed: 'V',
    does: 'record, sheet or margin, on a small screen',
    run: (store) => store.show(panes[(panes.indexOf(store.get().pane) + 1) % panes.length] ?? 'record'),
  },
  {
    codes: ['KeyD'],
    printed: 'D',
    does: 'drawing: the wall laid flat, or fundus and bubble',
    run: (store) => store.turnPicture(),
  },
  { codes: ['KeyS'], printed: 'S', does: 'save now', run: (_, actions) => actions.save() },
  { codes: ['KeyX'], printed: 'X', does: 'sign', run: (_, actions) => actions.sign() },
  { codes: ['Slash'], printed: '?', does: 'all keys', run: (_, actions) => actions.help() },
];

const takesLetters = (target: EventTarget | null) =>
  target instanceof HTMLElement && (target.isContentEditable || target.matches('input, select, textarea'));

/**
 * Runs what a key stands for: with Alt from anywhere, alone where nothing is being written. Ctrl+Z and Ctrl+Y undo and
 * redo the record outside boxes and the sheet. Answers whether the key was taken.
 */
export const pressPageKey = (event: KeyboardEvent, store: DeskStore, actions: PageActions): boolean => {
  const writing = takesLetters(event.target);
  if (event.ctrlKey || event.metaKey) {
    const isText =
      writing &&
      !(event.target instanceof HTMLInputElement && ['radio', 'checkbox'].includes(event.target.type));
    if (event.altKey || isText || (event.code !== 'KeyZ' && event.code !== 'KeyY')) return false;
    if (event.code === 'KeyY' || event.shiftKey) store.redo();
    else store.undo();
    return true;
  }
  if (event.key === 'Escape' && writing) {
    if (event.target instanceof HTMLElement) event.target.blur();
    document.getElementById('stage-title')?.focus();
    return true;
  }
  if (writing && !event.altKey) return false;
  if (event.shiftKey && event.code !== 'Slash') return false;
  const key = pageKeys.find(({ codes }) => codes.includes(event.code));
  if (key === undefined || (event.code === 'Slash' && !event.altKey && event.key !== '?')) return false;
  key.run(store, actions, event.code);
  return true;
};
