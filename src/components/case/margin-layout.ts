export interface Note {
  /** Where the note would stand, from the top, in pixels. */
  wanted: number;
  height: number;
}

/**
 * Tops of notes that stand as near to their words as they can without lying on one another. Notes come in order of
 * reading; of those level with each other the worse is given first and stays.
 */
export const stackNotes = (notes: readonly Note[], gap: number): number[] => {
  let free = 0;
  return notes.map(({ wanted, height }) => {
    const top = Math.max(wanted, free);
    free = top + height + gap;
    return top;
  });
};
