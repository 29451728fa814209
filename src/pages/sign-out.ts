import type { APIRoute } from 'astro';
import { lucia } from '../server/accounts/sessions.ts';
import { actorOf, clearCookie } from '../server/accounts/visit.ts';
import { appendAudit } from '../server/audit/log.ts';
import { database } from '../server/database.ts';

export const POST: APIRoute = async ({ locals: { visit }, cookies, redirect }) => {
  if (visit !== undefined) {
    await lucia().invalidateSession(visit.sessionId);
    await database().transaction((tx) =>
      appendAudit(tx, actorOf(visit), 'person:signed-out', visit.person.id),
    );
  }
  clearCookie(cookies);
  return redirect('/sign-in', 303);
};
