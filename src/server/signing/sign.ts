import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { cases, signedVersions } from '../../db/schema.ts';
import { type ApiError, type CaseSigned, meanings, type SignCase } from '../../domain/api.ts';
import { checkCase } from '../../domain/checks/check-case.ts';
import { RULES_VERSION } from '../../domain/checks/engine.ts';
import { blocking } from '../../domain/checks/flag.ts';
import { draftNote } from '../../domain/drafting/draft.ts';
import { mergeSheet } from '../../domain/drafting/merge.ts';
import { TEMPLATES_VERSION } from '../../domain/drafting/templates.generated.js';
import { RECORD_VERSION } from '../../domain/record/schema.ts';
import { ok, type Result } from '../../domain/result.ts';
import { canonical, verificationCode } from '../../domain/signing/canonical.ts';
import { FROZEN_FORMAT, type FrozenNote } from '../../domain/signing/frozen.ts';
import { confirmPassword } from '../accounts/sign-in.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { lockRevision } from '../cases/revision.ts';
import { database } from '../database.ts';
import { noteDocx } from '../documents/note-docx.ts';
import { draftLettersOf } from '../letters/on-signed.ts';
import { settingsOf } from '../practice/check-settings.ts';
import { sha256 } from './sha256.ts';

/** The zone in which times are printed. */
export const ZONE = Intl.DateTimeFormat().resolvedOptions().timeZone;

/**
 * Signs a case: password again, checks again on the server's own reading, then everything that the signature covers is frozen,
 * hashed, stored with its document, entered in the log and its letters drafted, all or nothing.
 */
export const signCase = async (
  visit: Visit,
  caseId: string,
  revision: number,
  { password, meaning }: SignCase,
): Promise<Result<CaseSigned, ApiError>> => {
  const { person, unit } = visit;
  const confirmed = await confirmPassword(person, password);
  if (!confirmed.ok) return confirmed;
  return database().transaction(async (tx): Promise<Result<CaseSigned, ApiError>> => {
    const asked = { unitId: unit.id, roles: person.roles, caseId, revision };
    const locked = await lockRevision(tx, asked, 'case:sign');
    if (!locked.ok) return locked;
    const { record, answers } = locked.value;
    const sheet = mergeSheet(locked.value.sheet, draftNote(record));
    const settings = await settingsOf(tx, unit.id);
    const flags = checkCase(record, sheet, settings);
    const inTheWay = blocking(flags, answers);
    if (inTheWay.length > 0) {
      const message = 'Some flags stand in the way of the signature.';
      return { ok: false, error: { code: 'blocked', message, flags: inTheWay } };
    }
    const { id: _, ...unitView } = unit;
    const signedAt = new Date();
    const frozen: FrozenNote = {
      format: FROZEN_FORMAT,
      caseId,
      version: 1,
      record,
      sheet,
      flags,
      answers,
      unit: unitView,
      settings,
      versions: { record: RECORD_VERSION, templates: TEMPLATES_VERSION, rules: RULES_VERSION },
      signature: {
        name: person.name,
        title: person.title,
        meaning: meanings[meaning],
        at: signedAt.toISOString(),
        zone: ZONE,
      },
    };
    const text = canonical(frozen);
    const hash = sha256(text);
    const code = verificationCode(hash);
    const docx = Buffer.from(await noteDocx(frozen, { sha256: hash, code }));
    const docxHash = sha256(docx);
    const signedVersionId = randomUUID();
    await tx.insert(signedVersions).values({
      id: signedVersionId,
      caseId,
      version: frozen.version,
      canonical: text,
      sha256: hash,
      verificationCode: code,
      signerId: person.id,
      signedAt,
      docx,
      docxSha256: docxHash,
    });
    await tx.update(cases).set({ state: 'signed' }).where(eq(cases.id, caseId));
    await draftLettersOf(tx, signedVersionId, frozen);
    await appendAudit(tx, actorOf(visit), 'note:signed', signedVersionId, {
      caseId,
      sha256: hash,
      docxSha256: docxHash,
      version: frozen.version,
    });
    return ok({
      signedVersionId,
      version: frozen.version,
      sha256: hash,
      verificationCode: code,
      signedAt: signedAt.toISOString(),
    });
  });
};
