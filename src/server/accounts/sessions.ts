import { createHash } from 'node:crypto';
import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import { type Adapter, Lucia, TimeSpan } from 'lucia';
import type { Database } from '../../db/client.ts';
import { people, sessions } from '../../db/schema.ts';
import type { Role } from '../../domain/access/policy.ts';
import { config } from '../config.ts';
import { database } from '../database.ts';

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof openLucia>;
    DatabaseUserAttributes: {
      unitId: string;
      email: string;
      name: string;
      title: string;
      roles: Role[];
      active: boolean;
    };
    DatabaseSessionAttributes: { createdAt?: Date };
  }
}

const digest = (token: string): string => createHash('sha256').update(token).digest('hex');

/** Keeps only the SHA-256 of a token, so that a copy of the table opens no session. */
const hashed = (adapter: Adapter): Adapter => ({
  getSessionAndUser: async (token) => {
    const [session, user] = await adapter.getSessionAndUser(digest(token));
    return [session === null ? null : { ...session, id: token }, user];
  },
  getUserSessions: (userId) => adapter.getUserSessions(userId),
  setSession: (session) => adapter.setSession({ ...session, id: digest(session.id) }),
  updateSessionExpiration: (token, expiresAt) => adapter.updateSessionExpiration(digest(token), expiresAt),
  deleteSession: (token) => adapter.deleteSession(digest(token)),
  deleteUserSessions: (userId) => adapter.deleteUserSessions(userId),
  deleteExpiredSessions: () => adapter.deleteExpiredSessions(),
});

const openLucia = (db: Database) => {
  const { sessionIdleMinutes, publicAddress } = config();
  return new Lucia(hashed(new DrizzlePostgreSQLAdapter(db, sessions, people)), {
    // Idle for this long ends a session: it is renewed in the second half of its life.
    sessionExpiresIn: new TimeSpan(sessionIdleMinutes, 'm'),
    sessionCookie: {
      name: 'buckram-session',
      expires: false,
      attributes: { secure: publicAddress.startsWith('https:'), sameSite: 'lax' },
    },
    getUserAttributes: ({ unitId, email, name, title, roles, active }) => ({
      unitId,
      email,
      name,
      title,
      roles,
      active,
    }),
    getSessionAttributes: ({ createdAt }) => ({ createdAt }),
  });
};

let opened: ReturnType<typeof openLucia> | undefined;

export const lucia = () => {
  opened ??= openLucia(database());
  return opened;
};
