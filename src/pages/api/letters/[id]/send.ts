import { sendLetterInput } from '../../../../domain/letters/api.ts';
import { route } from '../../../../server/http/route.ts';
import { requestSending } from '../../../../server/jobs/boss.ts';
import { queueLetter } from '../../../../server/letters/queue.ts';

export const POST = route({
  action: 'letter:send',
  ifMatch: true,
  input: sendLetterInput,
  run: async ({ visit, params, revision, input }) => {
    const id = params.id ?? '';
    const result = await queueLetter(visit, id, revision, input.by);
    if (result.ok && input.by === 'mail') await requestSending(id);
    return result;
  },
});
