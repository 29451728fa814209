/** File name of a document: what it is and the code that finds it, never whom it is about. */
export const documentName = (kind: 'note' | 'letter' | 'draft', code: string): string =>
  `${kind}-${code}.docx`;
