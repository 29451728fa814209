import { defineMiddleware } from 'astro:middleware';
import { randomUUID } from 'node:crypto';
import type { APIContext } from 'astro';
import { readVisit } from './server/accounts/visit.ts';
import { log } from './server/http/log.ts';
import { jobs } from './server/jobs/boss.ts';

/** Pages that are there before anybody has signed in. */
const open = new Set(['/sign-in', '/404', '/403', '/500']);

/** Styles that islands write on their elements need the attribute allowed; styles in files stay hashed. */
const allowStyleAttributes = (headers: Headers) => {
  const policy = headers.get('content-security-policy');
  if (policy !== null) headers.set('content-security-policy', `${policy} style-src-attr 'unsafe-inline';`);
};

const isApi = ({ url }: APIContext) => url.pathname.startsWith('/api/');

const answer = async (context: APIContext, next: () => Promise<Response>): Promise<Response> => {
  const visit = await readVisit(context.cookies);
  if (visit !== undefined) context.locals.visit = visit;
  return visit === undefined && !isApi(context) && !open.has(context.url.pathname)
    ? context.redirect(`/sign-in?next=${encodeURIComponent(context.url.pathname)}`)
    : next();
};

export const onRequest = defineMiddleware(async (context, next) => {
  if (context.isPrerendered) return next();
  const begun = performance.now();
  context.locals.requestId ??= randomUUID();
  // The queue works from the first request on, and a server that starts makes one to itself: letters do not wait for somebody to come.
  jobs().catch((error: unknown) => {
    log().error({ name: error instanceof Error ? error.name : 'unknown' }, 'the job queue could not start');
  });
  const say = (status: number) =>
    log()[status < 500 ? 'info' : 'error'](
      {
        request: context.locals.requestId,
        method: context.request.method,
        route: context.routePattern,
        status,
        ms: Math.round(performance.now() - begun),
      },
      'answered',
    );
  const response = await answer(context, next).catch((error: unknown) => {
    say(500);
    throw error;
  });
  say(response.status);
  const isBare = response.body === null && !isApi(context);
  if (isBare && (response.status === 403 || response.status === 404))
    return context.rewrite(`/${response.status}`);
  response.headers.set('x-request-id', context.locals.requestId);
  allowStyleAttributes(response.headers);
  return response;
});
