import { database } from '../../../../server/database.ts';
import { documentName } from '../../../../server/documents/document-name.ts';
import { download } from '../../../../server/http/download.ts';
import { route } from '../../../../server/http/route.ts';
import { documentOf, loadLetter, recipientsOf } from '../../../../server/letters/letter.ts';

/** What was sent, or what would be sent now. */
export const GET = route({
  action: 'letter:read',
  run: async ({ visit, params }) => {
    const found = await loadLetter(database(), visit.unit.id, params.id ?? '');
    if (found === undefined)
      return { ok: false, error: { code: 'not-found', message: 'There is no such letter.' } };
    const reader = (await recipientsOf(database(), visit.unit.id)).find(
      ({ id }) => id === found.letter.recipientId,
    );
    const docx = found.letter.docx ?? (await documentOf(found, reader));
    return download(documentName('letter', found.code), docx);
  },
});
