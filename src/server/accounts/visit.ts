import type { AstroCookies } from 'astro';
import { eq } from 'drizzle-orm';
import { units } from '../../db/schema.ts';
import type { Role } from '../../domain/access/policy.ts';
import type { UnitView } from '../../domain/api.ts';
import type { Actor } from '../audit/log.ts';
import { config } from '../config.ts';
import { database } from '../database.ts';
import { lucia } from './sessions.ts';

/** A signed-in person at a unit. */
export interface Visit {
  sessionId: string;
  person: { id: string; email: string; name: string; title: string; roles: Role[] };
  unit: UnitView & { id: string };
}

export const actorOf = ({ person, unit }: Visit): Actor & { personId: string } => ({
  personId: person.id,
  unitId: unit.id,
});

const HOUR = 3_600_000;

const unitOf = async (id: string): Promise<Visit['unit'] | undefined> => {
  const [unit] = await database().select().from(units).where(eq(units.id, id));
  if (unit === undefined) return undefined;
  const { name, service, address, telephone, email, demonstration } = unit;
  return { id, name, service, address, telephone, email, demonstration };
};

/** The visit that the cookie opens; ends it when it has lasted too long or the person is no longer active. */
export const readVisit = async (cookies: AstroCookies): Promise<Visit | undefined> => {
  const accounts = lucia();
  const token = cookies.get(accounts.sessionCookieName)?.value;
  if (token === undefined) return undefined;
  const { session, user } = await accounts.validateSession(token);
  if (session === null) return undefined;
  const begun = session.createdAt?.getTime() ?? 0;
  if (!user.active || Date.now() - begun > config().sessionAbsoluteHours * HOUR) {
    await accounts.invalidateSession(token);
    return undefined;
  }
  if (session.fresh) setCookie(cookies, token);
  const unit = await unitOf(user.unitId);
  if (unit === undefined) return undefined;
  const { id, email, name, title, roles } = user;
  return { sessionId: token, person: { id, email, name, title, roles }, unit };
};

export const setCookie = (cookies: AstroCookies, token: string): void => {
  const cookie = lucia().createSessionCookie(token);
  cookies.set(cookie.name, cookie.value, { ...cookie.attributes, path: '/' });
};

export const clearCookie = (cookies: AstroCookies): void => {
  cookies.delete(lucia().sessionCookieName, { path: '/' });
};
