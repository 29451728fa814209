import { saveCase as saveCaseInput } from '../../../../domain/api.ts';
import { openCase } from '../../../../server/cases/open.ts';
import { saveCase } from '../../../../server/cases/save.ts';
import { database } from '../../../../server/database.ts';
import { route } from '../../../../server/http/route.ts';

export const GET = route({
  action: 'case:list-own',
  run: async ({ visit, params }) => {
    const opened = await openCase(database(), visit, params.id ?? '');
    return opened === undefined
      ? { ok: false, error: { code: 'not-found', message: 'There is no such case.' } }
      : { ok: true, value: opened.view };
  },
});

export const PUT = route({
  action: 'case:write',
  input: saveCaseInput,
  ifMatch: true,
  run: ({ visit, params, revision, input }) => saveCase(visit, params.id ?? '', revision, input),
});
