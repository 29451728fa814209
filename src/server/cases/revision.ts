import type { Database } from '../../db/client.ts';
import type { cases } from '../../db/schema.ts';
import { type CaseState, may, type Role } from '../../domain/access/policy.ts';
import type { ApiError } from '../../domain/api.ts';
import type { Result } from '../../domain/result.ts';
import { lockCase, viewOf } from './load.ts';

interface Asked {
  unitId: string;
  roles: readonly Role[];
  caseId: string;
  revision: number;
}

const needsDraft = (state: CaseState): ApiError | undefined =>
  state === 'signed'
    ? { code: 'already-signed', message: 'This note is signed. It can no longer be changed.' }
    : undefined;

/** Locks a case for a change upon a revision, or says why it cannot be changed; nothing is lost either way. */
export const lockRevision = async (
  tx: Database,
  { unitId, roles, caseId, revision }: Asked,
  action: 'case:write' | 'case:sign',
): Promise<Result<typeof cases.$inferSelect, ApiError>> => {
  const row = await lockCase(tx, unitId, caseId);
  if (row === undefined)
    return { ok: false, error: { code: 'not-found', message: 'There is no such case.' } };
  const signed = needsDraft(row.state);
  if (signed !== undefined) return { ok: false, error: signed };
  if (!may(roles, action, row.state)) {
    return { ok: false, error: { code: 'not-allowed', message: 'Your role does not include this.' } };
  }
  if (row.revision !== revision) {
    const message = 'Somebody saved another version of this case meanwhile. Yours is kept on this page.';
    return { ok: false, error: { code: 'stale', message, current: viewOf(row) } };
  }
  return { ok: true, value: row };
};
