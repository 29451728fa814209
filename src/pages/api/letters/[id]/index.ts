import { saveLetterInput } from '../../../../domain/letters/api.ts';
import { database } from '../../../../server/database.ts';
import { route } from '../../../../server/http/route.ts';
import { loadLetter, saveLetter } from '../../../../server/letters/letter.ts';

/** How far a letter is, for the page that waits. */
export const GET = route({
  action: 'letter:read',
  run: async ({ visit, params }) => {
    const found = await loadLetter(database(), visit.unit.id, params.id ?? '');
    if (found === undefined)
      return { ok: false, error: { code: 'not-found', message: 'There is no such letter.' } };
    const { state, lastError, attempts } = found.letter;
    return { ok: true, value: { state, lastError, attempts } };
  },
});

export const PUT = route({
  action: 'letter:write',
  input: saveLetterInput,
  ifMatch: true,
  run: ({ visit, params, revision, input }) => saveLetter(visit, params.id ?? '', revision, input),
});
