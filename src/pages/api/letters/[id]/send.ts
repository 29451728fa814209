import { route } from '../../../../server/http/route.ts';
import { requestSending } from '../../../../server/jobs/boss.ts';
import { queueLetter } from '../../../../server/letters/letter.ts';

export const POST = route({
  action: 'letter:send',
  ifMatch: true,
  run: async ({ visit, params, revision }) => {
    const id = params.id ?? '';
    const result = await queueLetter(visit, id, revision);
    if (result.ok) await requestSending(id);
    return result;
  },
});
