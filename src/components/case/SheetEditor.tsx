import { EditorContent, useEditor } from '@tiptap/react';
import { useEffect, useRef } from 'react';
import { redraw, redrawn } from './redraw.ts';
import { docFromSheet, type SheetDoc, sheetFromDoc } from './sheet-doc.ts';
import { marksKey, sheetNodes } from './sheet-nodes.ts';
import { statementMarks } from './statement-marks.ts';
import { useDeskTools } from './use-desk.ts';

/** The sheet, to be written in. Loaded apart, so that the page is there before it. */
const SheetEditor = () => {
  const { store } = useDeskTools();
  const shown = useRef(store.get().sheet);

  const editor = useEditor({
    extensions: sheetNodes,
    content: docFromSheet(shown.current),
    immediatelyRender: false,
    injectCSS: false,
    editorProps: {
      attributes: {
        class: 'sheet-words',
        role: 'textbox',
        'aria-multiline': 'true',
        'aria-label': 'The operative note, to be edited',
        spellcheck: 'true',
      },
    },
    onUpdate: ({ editor: written, transaction }) => {
      if (transaction.getMeta(redrawn) === true) return;
      const doc: unknown = written.getJSON();
      store.editSheet(sheetFromDoc(doc as SheetDoc, store.get().sheet));
    },
    onSelectionUpdate: ({ editor: written }) => {
      const reads: unknown = written.state.selection.$from.parent.attrs.reads;
      store.light(written.isFocused && Array.isArray(reads) ? reads : null);
    },
    onBlur: () => store.light(null),
  });

  useEffect(() => {
    if (editor === null) return;
    let marked = '';
    const follow = () => {
      const state = store.get();
      if (state.sheet !== shown.current) {
        shown.current = state.sheet;
        const tr = redraw(editor.state, state.sheet);
        if (tr !== null) editor.view.dispatch(tr);
      }
      const marks = statementMarks(state);
      const key = JSON.stringify([...marks]);
      if (key === marked) return;
      marked = key;
      editor.view.dispatch(editor.state.tr.setMeta(marksKey, marks).setMeta('addToHistory', false));
    };
    follow();
    return store.subscribe(follow);
  }, [editor, store]);

  return <EditorContent editor={editor} />;
};

export default SheetEditor;
