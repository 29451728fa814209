import { asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { addenda } from '../../db/schema.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import { canonical, verificationCode } from '../../domain/signing/canonical.ts';
import { ADDENDUM_FORMAT, type FrozenAddendum } from '../../domain/signing/frozen.ts';
import { confirmPassword } from '../accounts/sign-in.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { lockCase } from '../cases/load.ts';
import { database } from '../database.ts';
import { sha256 } from './sha256.ts';
import { ZONE } from './sign.ts';
import { readSigned } from './signed-version.ts';

export interface Addendum {
  frozen: FrozenAddendum;
  code: string;
  /** Whether its text is still the one that was hashed. */
  holds: boolean;
}

/** What was added to a signed note, the oldest first, each proved as it is read. */
export const addendaOf = async (db: Database, signedVersionId: string): Promise<Addendum[]> => {
  const rows = await db
    .select()
    .from(addenda)
    .where(eq(addenda.signedVersionId, signedVersionId))
    .orderBy(asc(addenda.number));
  return rows.map((row) => {
    const frozen: FrozenAddendum = JSON.parse(row.canonical);
    const holds = canonical(frozen) === row.canonical && sha256(row.canonical) === row.sha256;
    return { frozen, code: row.verificationCode, holds };
  });
};

/** Adds to a signed note without touching it: password again, a reason, the words; hashed, kept and logged in one step. */
export const addAddendum = async (
  visit: Visit,
  signedVersionId: string,
  given: { reason: string; text: string; password: string },
): Promise<Result<null>> => {
  const [reason, text] = [given.reason.trim(), given.text.trim()];
  if (reason.length < 3) return fail('reason', 'Write why the note is added to.');
  if (reason.length > 1000)
    return fail('reason', 'Use at most 1000 characters; the rest belongs in the text.');
  if (text.length < 3) return fail('text', 'Write what is added.');
  if (text.length > 8000)
    return fail('text', 'Use at most 8000 characters, and a second addendum for the rest.');
  const confirmed = await confirmPassword(visit.person, given.password);
  if (!confirmed.ok) return confirmed;
  return database().transaction(async (tx) => {
    const found = await readSigned(tx, visit.unit.id, { id: signedVersionId });
    if (found === undefined) return fail('not-found', 'There is no such note.');
    // Two people may add at once: the second waits for the number of the first.
    await lockCase(tx, visit.unit.id, found.row.caseId);
    const number = (await addendaOf(tx, signedVersionId)).length + 1;
    const signedAt = new Date();
    const frozen: FrozenAddendum = {
      format: ADDENDUM_FORMAT,
      noteSha256: found.row.sha256,
      number,
      reason,
      text,
      signature: {
        name: visit.person.name,
        title: visit.person.title,
        at: signedAt.toISOString(),
        zone: ZONE,
      },
    };
    const written = canonical(frozen);
    const hash = sha256(written);
    const row = {
      signedVersionId,
      number,
      canonical: written,
      sha256: hash,
      signerId: visit.person.id,
      signedAt,
    };
    await tx.insert(addenda).values({ ...row, verificationCode: verificationCode(hash) });
    await appendAudit(tx, actorOf(visit), 'note:added-to', signedVersionId, { number, sha256: hash });
    return ok(null);
  });
};
