import { saveLetterInput } from '../../../../domain/letters/api.ts';
import { database } from '../../../../server/database.ts';
import { route } from '../../../../server/http/route.ts';
import { loadLetter, missing, saveLetter, viewOf } from '../../../../server/letters/letter.ts';

/** How far a letter is and what it says now, for the page that waits or has to compare. */
export const GET = route({
  action: 'letter:read',
  run: async ({ visit, params }) => {
    const found = await loadLetter(database(), visit.unit.id, params.id ?? '');
    return found === undefined ? missing() : { ok: true, value: viewOf(found) };
  },
});

export const PUT = route({
  action: 'letter:write',
  input: saveLetterInput,
  ifMatch: true,
  run: ({ visit, params, revision, input }) => saveLetter(visit, params.id ?? '', revision, input),
});
