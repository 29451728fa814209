import { Extension, Node } from '@tiptap/core';
import { history, redo, undo } from '@tiptap/pm/history';
import type { Node as ProseNode } from '@tiptap/pm/model';
import { type EditorState, Plugin, PluginKey, TextSelection, type Transaction } from '@tiptap/pm/state';
import { Decoration, DecorationSet } from '@tiptap/pm/view';
import type { StatementMarks } from './statement-marks.ts';

const sheetDocument = Node.create({ name: 'doc', topNode: true, content: 'section*' });

const plainText = Node.create({ name: 'text', group: 'inline' });

const section = Node.create({
  name: 'section',
  content: 'statement*',
  isolating: true,
  addAttributes: () => ({ id: { default: '' }, heading: { default: '' } }),
  parseHTML: () => [],
  renderHTML: ({ node }) => [
    'section',
    { class: 'sheet-section' },
    ['h3', { contenteditable: 'false' }, String(node.attrs.heading)],
    ['p', 0],
  ],
});

const statement = Node.create({
  name: 'statement',
  content: 'text*',
  marks: '',
  addAttributes: () => ({
    id: { default: null },
    origin: { default: 'own' },
    drafted: { default: '' },
    reads: { default: [] },
  }),
  parseHTML: () => [],
  renderHTML: ({ node }) => [
    'span',
    { class: 'statement', 'data-statement': String(node.attrs.id), 'data-origin': String(node.attrs.origin) },
    ['span', { class: 'words' }, 0],
    // A gap that cannot be written in keeps the end of one statement apart from the start of the next.
    ['span', { class: 'gap', contenteditable: 'false' }, ' '],
  ],
});

const ownAttributes = { id: null, origin: 'own', drafted: '', reads: [] };

/** A new statement behind the one with the caret, or before it when the caret stands at its start. */
const startStatement = (state: EditorState): Transaction | null => {
  const { $from } = state.selection;
  if ($from.parent.type.name !== 'statement') return null;
  const tr = state.tr.deleteSelection();
  const place = tr.selection.$from;
  const type = place.parent.type;
  if (place.parentOffset === 0 && place.parent.content.size > 0) {
    const before = place.before();
    tr.insert(before, type.create(ownAttributes));
    return tr.setSelection(TextSelection.create(tr.doc, before + 1)).scrollIntoView();
  }
  return tr.split(place.pos, 1, [{ type, attrs: ownAttributes }]).scrollIntoView();
};

const statementsIn = (doc: ProseNode, visit: (node: ProseNode, position: number) => void) =>
  doc.descendants((node, position) => {
    if (node.type.name !== 'statement') return true;
    visit(node, position);
    return false;
  });

/** Gives an id of its own to every statement that has none, or has that of another. */
const withIds = (state: EditorState): Transaction | null => {
  const tr = state.tr;
  const seen = new Set<string>();
  let last = 0;
  statementsIn(state.doc, (node) => {
    last = Math.max(last, Number(/^own-(\d+)$/.exec(String(node.attrs.id))?.[1] ?? 0));
  });
  statementsIn(state.doc, (node, position) => {
    const id: unknown = node.attrs.id;
    if (typeof id === 'string' && !seen.has(id)) {
      seen.add(id);
      return;
    }
    last += 1;
    tr.setNodeMarkup(position, null, { ...ownAttributes, id: `own-${last}` });
  });
  return tr.docChanged ? tr : null;
};

const statementIds = new Plugin({
  appendTransaction: (transactions, _, state) =>
    transactions.some((transaction) => transaction.docChanged) ? withIds(state) : null,
});

export const marksKey = new PluginKey<StatementMarks>('statement-marks');

const marksPlugin = new Plugin<StatementMarks>({
  key: marksKey,
  state: {
    init: () => new Map(),
    apply: (transaction, marks) => (transaction.getMeta(marksKey) as StatementMarks | undefined) ?? marks,
  },
  props: {
    decorations: (state) => {
      const marks = marksKey.getState(state);
      const decorations: Decoration[] = [];
      statementsIn(state.doc, (node, position) => {
        const classes = marks?.get(String(node.attrs.id)) ?? '';
        const all = node.content.size === 0 ? `${classes} statement-empty` : classes;
        if (all !== '') decorations.push(Decoration.node(position, position + node.nodeSize, { class: all }));
      });
      return DecorationSet.create(state.doc, decorations);
    },
  },
});

const writing = Extension.create({
  name: 'writing',
  addKeyboardShortcuts() {
    const run = (command: typeof undo) => () => command(this.editor.state, this.editor.view.dispatch);
    return {
      Enter: () => {
        const tr = startStatement(this.editor.state);
        if (tr !== null) this.editor.view.dispatch(tr);
        return true;
      },
      'Mod-z': run(undo),
      'Mod-Shift-z': run(redo),
      'Mod-y': run(redo),
    };
  },
  addProseMirrorPlugins: () => [
    history(),
    statementIds,
    marksPlugin,
    new Plugin({
      props: {
        // Words come in, their dress stays outside: a sheet holds plain sentences.
        handlePaste: (view, event) => {
          const words = event.clipboardData?.getData('text/plain').replace(/\s+/g, ' ') ?? '';
          view.dispatch(view.state.tr.insertText(words).scrollIntoView());
          return true;
        },
        handleDrop: () => true,
        handleDOMEvents: {
          // The browser takes the start of a statement for the end of the one before; the editor knows better.
          beforeinput: (view, event) => {
            const { $from, empty } = view.state.selection;
            if (event.inputType !== 'insertText' || event.data === null || view.composing) return false;
            if (!empty || $from.parentOffset !== 0) return false;
            event.preventDefault();
            view.dispatch(view.state.tr.insertText(event.data).scrollIntoView());
            return true;
          },
        },
        clipboardTextSerializer: (slice) => slice.content.textBetween(0, slice.content.size, ' '),
      },
    }),
  ],
});

/** The editor of a sheet: sections of statements, plain words, and nothing that the printed note cannot carry. */
export const sheetNodes = [sheetDocument, section, statement, plainText, writing];
