import { actorOf } from '../../../../server/accounts/visit.ts';
import { appendAudit } from '../../../../server/audit/log.ts';
import { database } from '../../../../server/database.ts';
import { documentName } from '../../../../server/documents/document-name.ts';
import { download } from '../../../../server/http/download.ts';
import { route } from '../../../../server/http/route.ts';
import { readSigned } from '../../../../server/signing/signed-version.ts';

export const GET = route({
  action: 'signed:read',
  run: async ({ visit, params }) => {
    const found = await readSigned(database(), visit.unit.id, { id: params.id ?? '' });
    if (found === undefined)
      return { ok: false, error: { code: 'not-found', message: 'There is no such note.' } };
    await database().transaction((tx) => appendAudit(tx, actorOf(visit), 'note:downloaded', found.row.id));
    return download(documentName('note', found.row.verificationCode), found.row.docx);
  },
});
