import type { APIContext, APIRoute } from 'astro';
import type { z } from 'zod';
import { type Action, may } from '../../domain/access/policy.ts';
import type { ApiError } from '../../domain/api.ts';
import type { Result } from '../../domain/result.ts';
import type { Visit } from '../accounts/visit.ts';
import { log } from './log.ts';
import { json, refuse } from './refusals.ts';
import { unstorable } from './storable.ts';

export interface Request<Input> {
  visit: Visit;
  input: Input;
  /** Revision from `If-Match`; 0 where the route does not ask for one. */
  revision: number;
  params: Readonly<Record<string, string | undefined>>;
  context: APIContext;
}

interface Spec<Input> {
  /** What the policy table must allow. The state of a case is asked again by the use case. */
  action: Action;
  input?: z.ZodType<Input>;
  ifMatch?: boolean;
  run: (request: Request<Input>) => Promise<Result<unknown, ApiError> | Response>;
}

const readBody = async <Input>(
  request: globalThis.Request,
  schema: z.ZodType<Input>,
): Promise<Result<Input, ApiError>> => {
  const body: unknown = await request.json().catch(() => undefined);
  const parsed = schema.safeParse(body);
  const issues = parsed.success
    ? unstorable(parsed.data)
    : parsed.error.issues.map(({ path, message }) => ({ path: path.map(String).join('.'), message }));
  if (parsed.success && issues.length === 0) return { ok: true, value: parsed.data };
  return { ok: false, error: { code: 'invalid', message: 'Some of this cannot be kept as it is.', issues } };
};

const revisionOf = (request: globalThis.Request): number | undefined => {
  const written = /^"(\d{1,9})"$/.exec(request.headers.get('if-match') ?? '')?.[1];
  return written === undefined ? undefined : Number(written);
};

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

const answer = async <Input>(spec: Spec<Input>, context: APIContext): Promise<Response> => {
  const visit = context.locals.visit;
  if (visit === undefined) return refuse({ code: 'sign-in-needed', message: 'Sign in again to go on.' });
  if (!may(visit.person.roles, spec.action)) {
    return refuse({ code: 'not-allowed', message: 'Your role does not include this.' });
  }
  if (context.params.id !== undefined && !UUID.test(context.params.id)) {
    return refuse({ code: 'not-found', message: 'There is nothing here.' });
  }
  const revision = revisionOf(context.request);
  if (spec.ifMatch === true && revision === undefined) {
    return refuse({ code: 'precondition-needed', message: 'Say upon which revision: If-Match: "14".' });
  }
  const input = spec.input === undefined ? undefined : await readBody(context.request, spec.input);
  if (input !== undefined && !input.ok) return refuse(input.error);
  const result = await spec.run({
    visit,
    input: input?.value as Input,
    revision: revision ?? 0,
    params: context.params,
    context,
  });
  if (result instanceof Response) return result;
  return result.ok ? json(result.value) : refuse(result.error);
};

/** One route of the API: who may, what comes in, what is done. Everything unexpected answers 500 without a word of it. */
export const route =
  <Input = undefined>(spec: Spec<Input>): APIRoute =>
  async (context) => {
    try {
      return await answer(spec, context);
    } catch (error) {
      log().error(
        {
          request: context.locals.requestId,
          route: context.routePattern,
          error: error instanceof Error ? error.name : 'unknown',
        },
        'a route failed',
      );
      return refuse({ code: 'failed', message: 'This did not work. Nothing was changed; try again.' });
    }
  };
