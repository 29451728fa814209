import { may } from '../../../../domain/access/policy.ts';
import { draftNote } from '../../../../domain/drafting/draft.ts';
import { mergeSheet } from '../../../../domain/drafting/merge.ts';
import { loadCase } from '../../../../server/cases/load.ts';
import { database } from '../../../../server/database.ts';
import { documentName } from '../../../../server/documents/document-name.ts';
import { draftDocx } from '../../../../server/documents/note-docx.ts';
import { download } from '../../../../server/http/download.ts';
import { route } from '../../../../server/http/route.ts';

export const GET = route({
  action: 'case:read-draft',
  run: async ({ visit, params }) => {
    const row = await loadCase(database(), visit.unit.id, params.id ?? '');
    if (row === undefined || !may(visit.person.roles, 'case:read-draft', row.state)) {
      return { ok: false, error: { code: 'not-found', message: 'There is no such draft.' } };
    }
    const sheet = mergeSheet(row.sheet, draftNote(row.record));
    const docx = await draftDocx(row.record, sheet, visit.unit, row.revision, row.savedAt.toISOString());
    return download(documentName('draft', `${row.id.slice(0, 8)}-${row.revision}`), docx);
  },
});
