import { describe, expect, it } from 'vitest';
import type { Sheet, Statement } from '../../../src/domain/drafting/sheet.ts';
import { keepWords, takenOut, withWords } from '../../../src/domain/letters/words.ts';

const drafted = (id: string, text: string): Statement => ({
  id,
  origin: 'drafted',
  text,
  drafted: text,
  reads: ['who.eye'],
});

const stored: Sheet = {
  title: 'Letter',
  sections: [
    {
      id: 'eye',
      heading: 'Eye',
      statements: [drafted('a', 'Left eye.'), drafted('b', 'Gas is in the eye.')],
    },
    { id: 'review', heading: 'Review', statements: [drafted('c', 'Seen again in a week.')] },
  ],
};

const saying = (words: Readonly<Record<string, string>>): Sheet => ({
  title: 'Another title',
  sections: [
    {
      id: 'eye',
      heading: 'Another heading',
      statements: Object.entries(words).map(([id, text]) => drafted(id, text)),
    },
  ],
});

const all = (sheet: Sheet) => sheet.sections.flatMap(({ statements }) => statements);

describe('withWords', () => {
  it('knows drafted, edited and taken out by the words alone', () => {
    const edited = withWords(drafted('a', 'Left eye.'), 'Only the left eye.');
    expect(edited).toMatchObject({ origin: 'edited', drafted: 'Left eye.' });
    expect(withWords(edited, 'Left eye.')).toMatchObject({ origin: 'drafted' });
    expect(withWords(edited, ' ')).toMatchObject({ origin: 'deleted', text: '' });
  });
});

describe('keepWords', () => {
  it('takes words over and nothing else: a browser cannot call its own words drafted', () => {
    const kept = keepWords(
      stored,
      saying({ a: 'Right eye.', b: 'Gas is in the eye.', c: 'Seen again in a week.' }),
    );
    expect(all(kept)[0]).toEqual({
      id: 'a',
      origin: 'edited',
      text: 'Right eye.',
      drafted: 'Left eye.',
      reads: ['who.eye'],
    });
    expect(kept.title).toBe('Letter');
    expect(kept.sections.map(({ heading }) => heading)).toEqual(['Eye', 'Review']);
    expect(all(kept).slice(1)).toEqual(all(stored).slice(1));
  });

  it('keeps what was left out as taken out, so that it can be put back', () => {
    const kept = keepWords(stored, saying({ a: 'Left eye.' }));
    expect(takenOut(kept)).toEqual(['Gas is in the eye.', 'Seen again in a week.']);
    expect(keepWords(kept, stored)).toEqual(stored);
  });

  it('takes further sentences as own, and lets them go again', () => {
    const kept = keepWords(stored, {
      ...stored,
      sections: [...stored.sections, { id: 'ps', heading: 'PS', statements: [drafted('x', 'Please ring.')] }],
    });
    expect(all(kept).at(-1)).toEqual({
      id: 'x',
      origin: 'own',
      text: 'Please ring.',
      drafted: '',
      reads: [],
    });
    expect(keepWords(kept, stored)).toEqual(stored);
  });
});
