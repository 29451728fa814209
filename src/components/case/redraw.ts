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

const redrawSection = (
  tr: Transaction,
  state: EditorState,
  section: ProseNode,
  at: number,
  wanted: readonly Statement[],
) => {
  const stays = (node: ProseNode, position: number) =>
    // An empty statement that is being written in is nobody's to remove.
    node.content.size === 0 &&
    state.selection.from > position &&
    state.selection.from < position + node.nodeSize;
  const ids = new Set(wanted.map(({ id }) => id));
  let next = 0;
  section.forEach((node, offset) => {
    const position = at + 1 + offset;
    const here = tr.mapping.map(position);
    const target = wanted.findIndex(({ id }, index) => index >= next && id === node.attrs.id);
    if (target === -1) {
      if (!(stays(node, position) && !ids.has(String(node.attrs.id)))) tr.delete(here, here + node.nodeSize);
      return;
    }
    const missing = wanted
      .slice(next, target)
      .map((statement) => state.schema.nodeFromJSON(statementNode(statement)));
    if (missing.length > 0) tr.insert(here, missing);
    const statement = wanted[target];
    if (statement === undefined) return;
    const now = tr.mapping.map(position);
    rewrite(tr, now, node.textContent, statement.text, state.schema);
    if (differs(node, statement)) {
      const { id, origin, drafted, reads } = statement;
      tr.setNodeMarkup(tr.mapping.map(position), null, { id, origin, drafted, reads });
    }
    next = target + 1;
  });
  const rest = wanted.slice(next).map((statement) => state.schema.nodeFromJSON(statementNode(statement)));
  if (rest.length > 0) tr.insert(tr.mapping.map(at + section.nodeSize - 1), rest);
};

/**
 * The change that makes the editor say what the sheet says, statement by statement; `null` when it does already.
 * Statements that agree are not touched, so that caret, selection and scroll stay.
 */
export const redraw = (state: EditorState, sheet: Sheet): Transaction | null => {
  const tr = state.tr;
  const wanted = new Map(sheet.sections.map((section) => [section.id, section]));
  const held = new Set<string>();
  state.doc.forEach((section, offset) => {
    const target = wanted.get(String(section.attrs.id));
    if (target === undefined) {
      const here = tr.mapping.map(offset);
      tr.delete(here, here + section.nodeSize);
      return;
    }
    held.add(target.id);
    redrawSection(tr, state, section, offset, standing(target));
  });
  if (held.size < sheet.sections.length) {
    // A new section comes in after the one that it follows in the sheet.
    let end = 0;
    for (const section of sheet.sections) {
      if (!held.has(section.id)) {
        const { id, heading } = section;
        const node = state.schema.node(
          'section',
          { id, heading },
          standing(section).map((statement) => state.schema.nodeFromJSON(statementNode(statement))),
        );
        tr.insert(end, node);
      }
      end = 0;
      let passed = false;
      tr.doc.forEach((node, offset) => {
        if (passed) return;
        end = offset + node.nodeSize;
        passed = node.attrs.id === section.id;
      });
    }
  }
  return tr.docChanged ? tr.setMeta(redrawn, true).setMeta('addToHistory', false) : null;
};
