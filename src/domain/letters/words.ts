import type { Sheet, Statement } from '../drafting/sheet.ts';

/** A statement with other words; what was drafted stays beside them. */
export const withWords = (statement: Statement, text: string): Statement => {
  if (text === statement.text) return statement;
  if (statement.origin !== 'own' && text === statement.drafted)
    return { ...statement, origin: 'drafted', text };
  if (text.trim() === '') return { ...statement, origin: 'deleted', text: '' };
  return { ...statement, origin: statement.origin === 'own' ? 'own' : 'edited', text };
};

const wordsIn = (sheet: Sheet): Map<string, string> =>
  new Map(sheet.sections.flatMap(({ statements }) => statements.map(({ id, text }) => [id, text] as const)));

/**
 * The stored letter with the words that were sent. Only words are taken over: headings, what was drafted and what it was drafted
 * from stay as stored, so that nobody can pass a word off as drafted. What is not sent counts as taken out; what is not stored, as own.
 */
export const keepWords = (stored: Sheet, sent: Sheet): Sheet => {
  const words = wordsIn(sent);
  const drafted = stored.sections.map((section) => ({
    ...section,
    statements: section.statements.filter(({ origin }) => origin !== 'own'),
  }));
  const known = new Set(drafted.flatMap(({ statements }) => statements.map(({ id }) => id)));
  const ownIn = (section: Sheet['sections'][number] | undefined): Statement[] =>
    (section?.statements ?? [])
      .filter(({ id, text }) => !known.has(id) && text.trim() !== '')
      .map(({ id, text }) => ({ id, origin: 'own', text, drafted: '', reads: [] }));
  const places = new Set(drafted.map(({ id }) => id));
  return {
    title: stored.title,
    sections: [
      ...drafted.map((section) => ({
        ...section,
        statements: [
          ...section.statements.map((one) => withWords(one, words.get(one.id) ?? '')),
          ...ownIn(sent.sections.find(({ id }) => id === section.id)),
        ],
      })),
      ...sent.sections
        .filter(({ id }) => !places.has(id))
        .map((section) => ({ ...section, statements: ownIn(section) })),
    ].filter(({ statements }) => statements.length > 0),
  };
};

/** What was drafted and no longer stands in the letter. */
export const takenOut = (sheet: Sheet): string[] =>
  sheet.sections.flatMap(({ statements }) =>
    statements.filter(({ origin }) => origin === 'deleted').map(({ drafted }) => drafted),
  );
