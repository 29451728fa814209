import { eq } from 'drizzle-orm';
import { caseRevisions, cases } from '../../db/schema.ts';
import type { ApiError, CaseSaved, SaveCase } from '../../domain/api.ts';
import { checkCase } from '../../domain/checks/check-case.ts';
import type { Answer } from '../../domain/checks/flag.ts';
import { ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { settingsOf } from '../practice/check-settings.ts';
import { lockRevision } from './revision.ts';

/** An answer that says the same as before keeps who gave it and when. */
const stamp = (given: SaveCase['answers'], before: readonly Answer[], by: string, at: string): Answer[] =>
  given.map(
    ({ flag, reason }) =>
      before.find((answer) => answer.flag === flag && answer.reason === reason) ?? { flag, reason, by, at },
  );

/** Saves a case upon the revision that the page holds, and keeps that revision for the history. */
export const saveCase = (
  visit: Visit,
  caseId: string,
  revision: number,
  { record, sheet, answers }: SaveCase,
): Promise<Result<CaseSaved, ApiError>> =>
  database().transaction(async (tx) => {
    const { person, unit } = visit;
    const locked = await lockRevision(
      tx,
      { unitId: unit.id, roles: person.roles, caseId, revision },
      'case:write',
    );
    if (!locked.ok) return locked;
    const savedAt = new Date();
    const stamped = stamp(answers, locked.value.answers, person.name, savedAt.toISOString());
    const next = { revision: revision + 1, record, sheet, answers: stamped, savedAt, savedBy: person.id };
    await tx
      .update(cases)
      .set({ ...next, surgeonId: locked.value.surgeonId ?? person.id })
      .where(eq(cases.id, caseId));
    await tx.insert(caseRevisions).values({ caseId, ...next });
    await appendAudit(tx, actorOf(visit), 'case:saved', caseId, { revision: next.revision });
    return ok({
      revision: next.revision,
      savedAt: savedAt.toISOString(),
      flags: checkCase(record, sheet, await settingsOf(tx, unit.id)),
      answers: stamped,
    });
  });
