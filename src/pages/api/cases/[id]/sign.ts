import { signCase as signCaseInput } from '../../../../domain/api.ts';
import { route } from '../../../../server/http/route.ts';
import { signCase } from '../../../../server/signing/sign.ts';

export const POST = route({
  action: 'case:sign',
  input: signCaseInput,
  ifMatch: true,
  run: ({ visit, params, revision, input }) => signCase(visit, params.id ?? '', revision, input),
});
