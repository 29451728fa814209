import type { Node as ProseNode, Schema } from '@tiptap/pm/model';
import type { EditorState, Transaction } from '@tiptap/pm/state';
import type { Sheet, Statement } from '../../domain/drafting/sheet.ts';
import { standing, statementNode } from './sheet-doc.ts';

/** Marks a change of the editor that came from the record and not from the person who types. */
export const redrawn = 'redrawn';

const commonStart = (a: string, b: string): number => {
  let length = 0;
  while (length < a.length && length < b.length && a[length] === b[length]) length += 1;
  return length;
};

/** Replaces the part of a statement's words that differs, so that a caret elsewhere in it stays where it is. */
const rewrite = (tr: Transaction, at: number, from: string, to: string, schema: Schema) => {
  if (from === to) return;
  const start = commonStart(from, to);
  const reversed = (text: string) => [...text.slice(start)].reverse().join('');
  const end = commonStart(reversed(from), reversed(to));
  const words = to.slice(start, to.length - end);
  const left = at + 1 + start;
  const right = at + 1 + from.length - end;
  if (words === '') tr.delete(left, right);
  else tr.replaceWith(left, right, schema.text(words));
};

const differs = (node: ProseNode, statement: Statement) =>
  node.attrs.id !== statement.id ||
  node.attrs.origin !== statement.origin ||
  node.attrs.drafted !== statement.drafted ||
  JSON.stringify(node.attrs.reads) !== JSON.stringify(statement.reads);

interface Kind<T extends { id: string }> {
  make: (item: T) => ProseNode;
  /** Makes a node that stands where it should say what the item says. */
  patch: (node: ProseNode, position: number, item: T) => void;
  /** Whether a node that nobody wants may go. */
  mayGo: (node: ProseNode, position: number) => boolean;
}

/** Walks over the children of a node and makes them the wanted ones, in order. Positions are those before any change. */
const align = <T extends { id: string }>(
  tr: Transaction,
  parent: ProseNode,
  start: number,
  wanted: readonly T[],
  kind: Kind<T>,
) => {
  let next = 0;
  parent.forEach((node, offset) => {
    const position = start + offset;
    const target = wanted.findIndex(({ id }, index) => index >= next && id === node.attrs.id);
    const item = wanted[target];
    if (item === undefined) {
      const here = tr.mapping.map(position);
      if (kind.mayGo(node, position)) tr.delete(here, here + node.nodeSize);
      return;
    }
    const missing = wanted.slice(next, target).map(kind.make);
    if (missing.length > 0) tr.insert(tr.mapping.map(position), missing);
    kind.patch(node, position, item);
    next = target + 1;
  });
  const rest = wanted.slice(next).map(kind.make);
  if (rest.length > 0) tr.insert(tr.mapping.map(start + parent.content.size), rest);
};

/**
 * The change that makes the editor say what the sheet says, statement by statement; `null` when it does already.
 * Statements that agree are not touched, so that caret, selection and scroll stay.
 */
export const redraw = (state: EditorState, sheet: Sheet): Transaction | null => {
  const { schema, selection, tr } = state;

  const makeStatement = (statement: Statement) => schema.nodeFromJSON(statementNode(statement));

  const patchStatement = (node: ProseNode, position: number, statement: Statement) => {
    rewrite(tr, tr.mapping.map(position), node.textContent, statement.text, schema);
    if (!differs(node, statement)) return;
    const { id, origin, drafted, reads } = statement;
    tr.setNodeMarkup(tr.mapping.map(position), null, { id, origin, drafted, reads });
  };

  // An empty statement that is being written in is nobody's to remove.
  const isIdle = (node: ProseNode, position: number) =>
    node.content.size > 0 || selection.from <= position || selection.from >= position + node.nodeSize;

  align(tr, state.doc, 0, sheet.sections, {
    make: (section) => {
      const { id, heading } = section;
      return schema.node('section', { id, heading }, standing(section).map(makeStatement));
    },
    patch: (node, position, section) => {
      align(tr, node, position + 1, standing(section), {
        make: makeStatement,
        patch: patchStatement,
        mayGo: isIdle,
      });
      if (node.attrs.heading === section.heading) return;
      tr.setNodeMarkup(tr.mapping.map(position), null, { id: section.id, heading: section.heading });
    },
    mayGo: () => true,
  });
  return tr.docChanged ? tr.setMeta(redrawn, true).setMeta('addToHistory', false) : null;
};
