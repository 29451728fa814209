import { getSchema } from '@tiptap/core';
import { EditorState } from '@tiptap/pm/state';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { redraw } from '../../../src/components/case/redraw.ts';
import {
  docFromSheet,
  keepEdited,
  type SheetDoc,
  sheetFromDoc,
  takeDrafted,
} from '../../../src/components/case/sheet-doc.ts';
import { sheetNodes } from '../../../src/components/case/sheet-nodes.ts';
import type { Sheet, Statement } from '../../../src/domain/drafting/sheet.ts';

const drafted = (id: string, text: string): Statement => ({
  id,
  origin: 'drafted',
  text,
  drafted: text,
  reads: ['who.eye'],
});

const sheetOf = (...statements: Statement[]): Sheet => ({
  title: 'Operative note',
  sections: [{ id: 'technique', heading: 'Technique', statements }],
});

const statementsOf = (sheet: Sheet) => sheet.sections.flatMap((section) => section.statements);

const two = sheetOf(drafted('a', 'A band was passed.'), drafted('b', 'It was fixed.'));

/** The document with another text in one statement. */
const written = (doc: SheetDoc, id: string, text: string): SheetDoc => ({
  ...doc,
  content: doc.content.map((section) => ({
    ...section,
    content: (section.content ?? []).map((node) =>
      node.attrs.id === id ? { ...node, content: text === '' ? [] : [{ type: 'text', text }] } : node,
    ),
  })),
});

describe('what people made of a sheet', () => {
  it('is the sheet itself when nothing was written', () => {
    expect(sheetFromDoc(docFromSheet(two), two)).toEqual(two);
  });

  it('makes a statement edited, and drafted again when the words are put back', () => {
    const edited = sheetFromDoc(written(docFromSheet(two), 'a', 'A strip was passed.'), two);
    expect(statementsOf(edited)[0]).toMatchObject({ origin: 'edited', text: 'A strip was passed.' });
    const back = sheetFromDoc(written(docFromSheet(edited), 'a', 'A band was passed.'), edited);
    expect(back).toEqual(two);
  });

  it('keeps a parted statement parted while it is written in', () => {
    const parted = sheetOf({ ...drafted('a', 'A strip was passed.'), drafted: 'A tyre.', origin: 'parted' });
    const doc = written(docFromSheet(parted), 'a', 'A long strip was passed.');
    expect(statementsOf(sheetFromDoc(doc, parted))[0]?.origin).toBe('parted');
  });

  it('takes out what is gone, where it stood, and can put it back', () => {
    const doc = docFromSheet(two);
    const without = {
      ...doc,
      content: doc.content.map((section) => ({ ...section, content: (section.content ?? []).slice(1) })),
    };
    const sheet = sheetFromDoc(without, two);
    expect(statementsOf(sheet).map(({ id, origin, text }) => [id, origin, text])).toEqual([
      ['a', 'deleted', ''],
      ['b', 'drafted', 'It was fixed.'],
    ]);
    expect(takeDrafted(sheet, 'a')).toEqual(two);
  });

  it('gives own statements ids, and drops them when they are emptied', () => {
    const doc = docFromSheet(two);
    const own = {
      type: 'statement' as const,
      attrs: { id: null, origin: 'own' as const, drafted: '', reads: [] },
      content: [{ type: 'text' as const, text: 'It bled a little.' }],
    };
    const withOwn = {
      ...doc,
      content: doc.content.map((section) => ({ ...section, content: [...(section.content ?? []), own] })),
    };
    const sheet = sheetFromDoc(withOwn, two);
    expect(statementsOf(sheet)[2]).toMatchObject({ id: 'own-1', origin: 'own', text: 'It bled a little.' });
    expect(sheetFromDoc(written(docFromSheet(sheet), 'own-1', ''), sheet)).toEqual(two);
  });

  it('keeps the words of one’s own on request', () => {
    const parted = sheetOf({ ...drafted('a', 'Mine.'), drafted: 'Theirs.', origin: 'parted' });
    expect(statementsOf(keepEdited(parted, 'a'))[0]).toMatchObject({ origin: 'edited', text: 'Mine.' });
  });
});

const schema = getSchema(sheetNodes);
const stateOf = (sheet: Sheet) =>
  EditorState.create({ schema, doc: schema.nodeFromJSON(docFromSheet(sheet)) });
const docOf = (state: EditorState): unknown => state.doc.toJSON();

const anyStatement = (id: string) =>
  fc.record({
    id: fc.constant(id),
    origin: fc.constantFrom('drafted' as const, 'edited' as const, 'parted' as const, 'deleted' as const),
    text: fc.string({ minLength: 1, maxLength: 12 }),
    drafted: fc.string({ maxLength: 12 }),
    reads: fc.constant<string[]>(['who.eye']),
  });

const anySheet = fc
  .tuple(
    fc.uniqueArray(fc.constantFrom('one', 'two', 'three'), { maxLength: 3 }),
    fc.shuffledSubarray(['a', 'b', 'c', 'd', 'e']),
  )
  .chain(([sections, ids]) =>
    fc.tuple(...ids.map(anyStatement)).map(
      (statements): Sheet => ({
        title: 'Note',
        sections: sections.map((id, index) => ({
          id,
          heading: id,
          statements: statements.filter((_, at) => at % sections.length === index),
        })),
      }),
    ),
  );

describe('redrawing the editor', () => {
  it('touches nothing when the words agree', () => {
    expect(redraw(stateOf(two), two)).toBeNull();
  });

  it('makes the editor say what any sheet says, from any other', () =>
    fc.assert(
      fc.property(anySheet, anySheet, (before, after) => {
        const state = stateOf(before);
        const tr = redraw(state, after);
        const now = tr === null ? state : state.apply(tr);
        expect(docOf(now)).toEqual(docOf(stateOf(after)));
        expect(redraw(now, after)).toBeNull();
      }),
      { numRuns: 300 },
    ));

  it('leaves the caret where it is in a statement that changes elsewhere', () => {
    const state = stateOf(two);
    const caret = 2 + 'A band'.length;
    const after = sheetOf(
      drafted('a', 'A band was passed behind all four recti.'),
      drafted('b', 'It was fixed.'),
    );
    const tr = redraw(state, after);
    expect(tr?.mapping.map(caret)).toBe(caret);
  });
});
