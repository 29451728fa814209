import type { AstroGlobal } from 'astro';
import { type Action, may } from '../../domain/access/policy.ts';
import type { Visit } from '../accounts/visit.ts';

/** The visit, when the policy table lets its person do this; otherwise the page that says so. */
export const enter = (astro: AstroGlobal, action: Action): Visit | Response => {
  const visit = astro.locals.visit;
  if (visit === undefined) {
    return astro.redirect(`/sign-in?next=${encodeURIComponent(astro.url.pathname)}`);
  }
  if (may(visit.person.roles, action)) return visit;
  return new Response(null, { status: 403, statusText: 'Forbidden' });
};
