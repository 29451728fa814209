import { type Answer, type Flag, flagKey, isAnswered, type Level, levels } from '../../domain/checks/flag.ts';
import type { Draft, DraftedTable, Sheet } from '../../domain/drafting/sheet.ts';
import type { Figure } from '../../domain/physics/figure.ts';
import { covers, type FieldPath, withValue } from '../../domain/record/paths.ts';
import { withoutNumbered } from '../../domain/record/remove-numbered.ts';
import type { CaseRecord, Stage } from '../../domain/record/schema.ts';
import type { BadEntry } from '../ui/EntryBox.tsx';

/** What the page works out from a record, at every change. */
export interface Derivers {
  check: (record: CaseRecord, sheet: Sheet) => Flag[];
  draft: (record: CaseRecord) => Draft;
  merge: (sheet: Sheet | null, draft: Draft) => Sheet;
  figures: (record: CaseRecord) => Figure[];
}

export interface Content {
  record: CaseRecord;
  sheet: Sheet | null;
  answers: readonly Answer[];
}

export type Pane = 'record' | 'sheet' | 'margin';
export const panes: readonly Pane[] = ['record', 'sheet', 'margin'];

export interface DeskState {
  readonly record: CaseRecord;
  readonly sheet: Sheet;
  /** Tables that stand under the words, drawn from the record alone. */
  readonly tables: readonly DraftedTable[];
  readonly answers: readonly Answer[];
  readonly flags: readonly Flag[];
  readonly figures: readonly Figure[];
  /** Worst level of the open flags that name a field. */
  readonly levels: ReadonlyMap<FieldPath, Level>;
  /** Ids of the notes in the margin that speak of a field, as `aria-describedby` takes them. */
  readonly described: ReadonlyMap<FieldPath, string>;
  readonly stage: Stage;
  /** Which item of a list is open, by the list's path. */
  readonly open: Readonly<Record<FieldPath, number>>;
  /** Groups whose less usual rows are shown. */
  readonly expanded: Readonly<Record<FieldPath, boolean>>;
  /** What was typed and could not be read, by field. */
  readonly bad: Readonly<Record<FieldPath, BadEntry>>;
  /** The field that has the focus. */
  readonly field: FieldPath | null;
  /** Facts of the statement that is rested on. */
  readonly lit: readonly FieldPath[];
  /** Id of the flag that was gone to last. */
  readonly flag: string | null;
  readonly pane: Pane;
  /** Which picture stands over the record: the wall laid flat, or the inside. */
  readonly picture: 'wall' | 'inside';
  /** Grows with every change that has to be saved. */
  readonly edits: number;
  readonly past: readonly CaseRecord[];
  readonly future: readonly CaseRecord[];
}

type Derived = Pick<
  DeskState,
  'record' | 'sheet' | 'tables' | 'answers' | 'flags' | 'figures' | 'levels' | 'described'
>;

export type DeskStore = ReturnType<typeof createDeskStore>;

const noPaths: readonly FieldPath[] = [];
const historyLength = 200;

const worstLevels = (flags: readonly Flag[], answers: readonly Answer[]) => {
  const found = new Map<FieldPath, Level>();
  for (const flag of flags) {
    if (isAnswered(flag, answers)) continue;
    for (const path of flag.fields) {
      const known = found.get(path);
      if (known === undefined || levels.indexOf(flag.level) < levels.indexOf(known))
        found.set(path, flag.level);
    }
  }
  return found;
};

/** Id of a flag's note in the margin. */
export const flagId = (flag: Flag): string => `flag:${flag.rule}:${flag.fields.join('+')}`;

const descriptions = (flags: readonly Flag[]) => {
  const found = new Map<FieldPath, string>();
  for (const flag of flags) {
    for (const path of flag.fields) found.set(path, `${found.get(path) ?? ''} ${flagId(flag)}`.trim());
  }
  return found;
};

/** The value before when the new one says the same, so that nothing is drawn again for it. */
const steady = <T>(before: T | undefined, now: T): T =>
  before !== undefined && JSON.stringify(before) === JSON.stringify(now) ? before : now;

/** The state of one case page. Everything that is worked out is worked out here, once a change. */
export const createDeskStore = (start: Content & { stage: Stage }, derive: Derivers) => {
  const listeners = new Set<() => void>();
  /** Path of the last change, so that typing a word is one step of undo. */
  let lastPath: FieldPath | null = null;

  let last: Derived | undefined;

  const derived = (record: CaseRecord, sheet: Sheet | null, answers: readonly Answer[]): Derived => {
    const draft = derive.draft(record);
    const merged = derive.merge(sheet, draft);
    const flags = steady(last?.flags, derive.check(record, merged));
    const now: Derived = {
      record,
      answers,
      flags,
      figures: steady(last?.figures, derive.figures(record)),
      levels: worstLevels(flags, answers),
      described: flags === last?.flags ? last.described : descriptions(flags),
      sheet: steady(sheet ?? undefined, merged),
      tables: steady(last?.tables, draft.tables),
    };
    last = now;
    return now;
  };

  let state: DeskState = {
    ...derived(start.record, start.sheet, start.answers),
    stage: start.stage,
    open: {},
    expanded: {},
    bad: {},
    field: null,
    lit: noPaths,
    flag: null,
    pane: 'record',
    picture: 'wall',
    edits: 0,
    past: [],
    future: [],
  };

  const set = (change: Partial<DeskState>) => {
    state = { ...state, ...change };
    for (const listener of listeners) listener();
  };

  const changeRecord = (record: CaseRecord, path: FieldPath | null, more: Partial<DeskState> = {}) => {
    if (record === state.record) return;
    const joins = path !== null && path === lastPath;
    lastPath = path;
    set({
      ...derived(record, state.sheet, state.answers),
      edits: state.edits + 1,
      past: joins ? state.past : [...state.past, state.record].slice(-historyLength),
      future: [],
      ...more,
    });
  };

  const step = (from: 'past' | 'future', to: 'past' | 'future') => {
    const record = state[from].at(-1);
    if (record === undefined) return;
    lastPath = null;
    set({
      ...derived(record, state.sheet, state.answers),
      edits: state.edits + 1,
      [from]: state[from].slice(0, -1),
      [to]: [...state[to], state.record],
    });
  };

  const setBad = (path: FieldPath, entry: BadEntry | undefined) => {
    const { [path]: _, ...others } = state.bad;
    set({ bad: entry === undefined ? others : { ...others, [path]: entry } });
  };

  const setAnswers = (answers: readonly Answer[], edits: number) =>
    set({ answers, levels: worstLevels(state.flags, answers), edits });

  return {
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => {
        listeners.delete(listener);
      };
    },
    get: () => state,

    /** Records a value; `undefined` makes the field absent. */
    record: (path: FieldPath, value: unknown) => changeRecord(withValue(state.record, path, value), path),

    /** Records several values as one step of undo; `step` joins it with others of the same name. */
    recordAll: (values: readonly (readonly [FieldPath, unknown])[], step: string) =>
      changeRecord(
        values.reduce((record, [path, value]) => withValue(record, path, value), state.record),
        step,
      ),

    addItem: (listPath: FieldPath, at: number, item: unknown = {}) =>
      changeRecord(withValue(state.record, `${listPath}.${at}`, item), null, {
        open: { ...state.open, [listPath]: at },
      }),

    removeItem: (listPath: FieldPath, at: number) =>
      changeRecord(withoutNumbered(state.record, listPath, at), null, {
        open: { ...state.open, [listPath]: Math.max(0, at - 1) },
        bad: Object.fromEntries(Object.entries(state.bad).filter(([path]) => !covers(listPath, path))),
      }),

    /** What people made of the sheet. */
    editSheet: (sheet: Sheet) => {
      if (sheet === state.sheet) return;
      lastPath = null;
      set({ sheet, edits: state.edits + 1 });
    },

    /** Answers a flag with a reason; an empty reason takes the answer back. */
    answer: (flag: Flag, reason: string) => {
      const key = flagKey(flag);
      const others = state.answers.filter((answer) => answer.flag !== key);
      const next = reason === '' ? others : [...others, { flag: key, reason, by: '', at: '' }];
      setAnswers(next, state.edits + 1);
    },

    /** Answers as the server keeps them, with who and when. */
    answersKept: (answers: readonly Answer[]) => setAnswers(answers, state.edits),

    /** Puts another version in place of this one. */
    replace: (content: Content, edited: boolean) => {
      lastPath = null;
      set({
        ...derived(content.record, content.sheet, content.answers),
        bad: {},
        past: [...state.past, state.record],
        future: [],
        edits: edited ? state.edits + 1 : state.edits,
      });
    },

    undo: () => step('past', 'future'),
    redo: () => step('future', 'past'),
    setBad,
    goTo: (stage: Stage) => set({ stage, pane: 'record' }),
    openItem: (listPath: FieldPath, at: number) => set({ open: { ...state.open, [listPath]: at } }),
    expand: (groupPath: FieldPath, shown: boolean) =>
      set({ expanded: { ...state.expanded, [groupPath]: shown } }),
    show: (pane: Pane) => set({ pane }),
    turnPicture: () => set({ picture: state.picture === 'wall' ? 'inside' : 'wall' }),
    focusOn: (field: FieldPath | null) => {
      if (field !== state.field) set({ field });
    },
    light: (paths: readonly FieldPath[] | null) => {
      const next = paths ?? noPaths;
      if (next !== state.lit) set({ lit: next });
    },
    /** Opens all that hides a field. */
    reveal: (path: FieldPath, groups: readonly FieldPath[]) => {
      const keys = path.split('.');
      const open = { ...state.open };
      keys.forEach((key, index) => {
        if (/^\d+$/.test(key)) open[keys.slice(0, index).join('.')] = Number(key);
      });
      const expanded = { ...state.expanded };
      for (const group of groups) expanded[group] = true;
      set({ stage: keys[0] as Stage, open, expanded, pane: 'record' });
    },
    goToFlag: (flag: Flag | null) => set({ flag: flag === null ? null : flagId(flag) }),
  };
};
