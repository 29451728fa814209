import { actorOf } from '../../../../server/accounts/visit.ts';
import { appendAudit } from '../../../../server/audit/log.ts';
import { database } from '../../../../server/database.ts';
import { download } from '../../../../server/http/download.ts';
import { route } from '../../../../server/http/route.ts';
import { readSigned } from '../../../../server/signing/signed-version.ts';

/** What `buckram verify` reads: the canonical text and what was stored beside it. */
export const GET = route({
  action: 'signed:verify',
  run: async ({ visit, params }) => {
    const found = await readSigned(database(), visit.unit.id, { id: params.id ?? '' });
    if (found === undefined)
      return { ok: false, error: { code: 'not-found', message: 'There is no such note.' } };
    await database().transaction((tx) => appendAudit(tx, actorOf(visit), 'note:exported', found.row.id));
    const { canonical, sha256, verificationCode, docxSha256 } = found.row;
    const body = JSON.stringify({ canonical, sha256, verificationCode, docxSha256 }, null, 2);
    return download(`proof-${verificationCode}.json`, Buffer.from(body), 'application/json');
  },
});
