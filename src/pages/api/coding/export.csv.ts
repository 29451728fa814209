import { actorOf } from '../../../server/accounts/visit.ts';
import { appendAudit } from '../../../server/audit/log.ts';
import { codingCsv } from '../../../server/coding/export.ts';
import { database } from '../../../server/database.ts';
import { download } from '../../../server/http/download.ts';
import { route } from '../../../server/http/route.ts';

export const GET = route({
  action: 'codes:export',
  run: async ({ visit }) => {
    const csv = await codingCsv(database(), visit.unit.id);
    await database().transaction((tx) => appendAudit(tx, actorOf(visit), 'codes:exported', visit.unit.id));
    return download('coding.csv', Buffer.from(`\uFEFF${csv}`), 'text/csv; charset=utf-8');
  },
});
