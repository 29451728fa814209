import { defineMiddleware } from 'astro:middleware';
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

export const onRequest = defineMiddleware(async (context, next) => {
  if (context.isPrerendered) return next();
  const begun = performance.now();
  // The queue works from the first request on, and a server that starts makes one to itself: letters do not wait for somebody to come.
  jobs().catch((error: unknown) => {
    log().error({ name: error instanceof Error ? error.name : 'unknown' }, 'the job queue could not start');
  });
  const visit = await readVisit(context.cookies);
  if (visit !== undefined) context.locals.visit = visit;
  const isApi = context.url.pathname.startsWith('/api/');
  const response =
    visit === undefined && !isApi && !open.has(context.url.pathname)
      ? context.redirect(`/sign-in?next=${encodeURIComponent(context.url.pathname)}`)
      : await next();
  log().info(
    {
      method: context.request.method,
      route: context.routePattern,
      status: response.status,
      ms: Math.round(performance.now() - begun),
    },
    'answered',
  );
  const isBare = response.body === null && !isApi;
  if (isBare && (response.status === 403 || response.status === 404))
    return context.rewrite(`/${response.status}`);
  allowStyleAttributes(response.headers);
  return response;
});
