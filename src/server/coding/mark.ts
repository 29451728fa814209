import { codings } from '../../db/schema.ts';
import { proposeCodes } from '../../domain/coding/propose.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { readSigned } from '../signing/signed-version.ts';

/** Keeps which of the proposed codes the coder took, "SET CODE" each, with a note. Marking again replaces. */
export const markCoded = (
  visit: Visit,
  id: string,
  chosen: readonly string[],
  note: string,
): Promise<Result<null>> =>
  database().transaction(async (tx) => {
    const found = await readSigned(tx, visit.unit.id, { id });
    if (found === undefined) return fail('not-found', 'There is no such note.');
    const codes = proposeCodes(found.note.record)
      .proposed.filter(({ set, code }) => chosen.includes(`${set} ${code}`))
      .map(({ set, code, title, modifiers }) => ({ set, code: [code, ...modifiers].join('-'), title }));
    if (codes.length === 0 && note.trim() === '') {
      return fail('invalid', 'Take at least one code, or write why none applies.');
    }
    const row = { coderId: visit.person.id, codes, note: note.trim().slice(0, 2000), markedAt: new Date() };
    await tx
      .insert(codings)
      .values({ signedVersionId: id, ...row })
      .onConflictDoUpdate({ target: codings.signedVersionId, set: row });
    await appendAudit(tx, actorOf(visit), 'codes:marked', id, { codes: codes.length });
    return ok(null);
  });
