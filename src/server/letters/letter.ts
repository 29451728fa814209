import { and, asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases, letters, recipients, signedVersions } from '../../db/schema.ts';
import type { Sheet } from '../../domain/drafting/sheet.ts';
import type { LetterView, SaveLetter } from '../../domain/letters/api.ts';
import { keepWords } from '../../domain/letters/words.ts';
import type { ProseFinding } from '../../domain/prose/finding.ts';
import { readProse } from '../../domain/prose/read.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import type { FrozenNote } from '../../domain/signing/frozen.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';

export type LetterRow = typeof letters.$inferSelect;
export type RecipientRow = typeof recipients.$inferSelect;

export interface OpenLetter {
  letter: LetterRow;
  note: FrozenNote;
  code: string;
}

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

const find = async (
  db: Database,
  unitId: string,
  id: string,
  lock: boolean,
): Promise<OpenLetter | undefined> => {
  if (!UUID.test(id)) return undefined;
  const query = db
    .select({ letter: letters, signed: signedVersions })
    .from(letters)
    .innerJoin(signedVersions, eq(letters.signedVersionId, signedVersions.id))
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .where(and(eq(letters.id, id), eq(cases.unitId, unitId)));
  const [found] = lock ? await query.for('update', { of: letters }) : await query;
  if (found === undefined) return undefined;
  const note: FrozenNote = JSON.parse(found.signed.canonical);
  return { letter: found.letter, note, code: found.signed.verificationCode };
};

/** A letter of this unit with the signed note that it rests on. */
export const loadLetter = (db: Database, unitId: string, id: string): Promise<OpenLetter | undefined> =>
  find(db, unitId, id, false);

export const missing = () => fail('not-found', 'There is no such letter.');

const stale = () =>
  fail('stale', 'Somebody changed this letter meanwhile. Your words are still here; nothing was lost.');
const notWaiting = () =>
  fail('not-waiting', 'This letter is on its way or sent. It can no longer be changed.');

/** The letter, locked until the transaction ends, if it may still be changed upon this revision. */
export const lockOpen = async (
  tx: Database,
  unitId: string,
  id: string,
  revision: number,
): Promise<Result<OpenLetter>> => {
  const found = await find(tx, unitId, id, true);
  if (found === undefined) return missing();
  const { state } = found.letter;
  if (state !== 'waiting' && state !== 'failed') return notWaiting();
  return found.letter.revision === revision ? ok(found) : stale();
};

/** Words of a letter that the signed facts deny, by statement. What was drafted from them cannot. */
export const deniedIn = (sheet: Sheet, record: CaseRecord): { statement: string; found: ProseFinding[] }[] =>
  sheet.sections.flatMap(({ statements }) =>
    statements.flatMap(({ id, origin, text }) => {
      const found = origin === 'drafted' || origin === 'deleted' ? [] : readProse(text, record);
      return found.length === 0 ? [] : [{ statement: id, found }];
    }),
  );

/** Whom the record names as this letter's reader; shown as a suggestion with that reason, never chosen for anybody. */
export const namedReader = ({ letter, note }: OpenLetter): { name: string; as: string } | undefined => {
  const { referrer, familyDoctor } = note.record.who ?? {};
  if (letter.kind === 'family-doctor' && familyDoctor !== undefined)
    return { name: familyDoctor, as: 'family doctor' };
  if (letter.kind === 'referring-doctor' && referrer?.name !== undefined)
    return { name: referrer.name, as: 'referring doctor' };
  return undefined;
};

const plainName = (name: string) => name.trim().replace(/\s+/g, ' ').toLowerCase();

/** Everybody in the directory, by name; only whom somebody confirmed can be written to. */
export const readersFor = async (db: Database, unitId: string, named: string | undefined) => {
  const rows = await db
    .select()
    .from(recipients)
    .where(and(eq(recipients.unitId, unitId), eq(recipients.active, true)))
    .orderBy(asc(recipients.name), asc(recipients.id));
  return rows.map(({ id, name, practice, address, email, confirmedAt }) => ({
    id,
    name,
    practice,
    address,
    email,
    isConfirmed: confirmedAt !== null,
    isNamed: named !== undefined && plainName(name) === plainName(named),
  }));
};

const when = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'short' });

/** What a letter's page shows and asks for again. */
export const viewOf = ({ letter }: OpenLetter): LetterView => ({
  state: letter.state,
  revision: letter.revision,
  sheet: letter.sheet,
  recipientId: letter.recipientId,
  lastError: letter.lastError,
  sentAt: letter.sentAt === null ? null : when.format(letter.sentAt),
  sentTo: letter.sentTo,
});

const isListed = async (tx: Database, unitId: string, id: string): Promise<boolean> => {
  const [row] = await tx
    .select({ id: recipients.id })
    .from(recipients)
    .where(and(eq(recipients.id, id), eq(recipients.unitId, unitId)));
  return row !== undefined;
};

/** Keeps the secretary's words and choice of reader upon a revision. */
export const saveLetter = (
  visit: Visit,
  id: string,
  revision: number,
  { sheet, recipientId }: SaveLetter,
): Promise<Result<{ revision: number }>> =>
  database().transaction(async (tx) => {
    const open = await lockOpen(tx, visit.unit.id, id, revision);
    if (!open.ok) return open;
    if (recipientId !== null && !(await isListed(tx, visit.unit.id, recipientId))) {
      return fail('no-recipient', 'This reader is not in the directory. Choose another.');
    }
    const next = revision + 1;
    await tx
      .update(letters)
      .set({ sheet: keepWords(open.value.letter.sheet, sheet), recipientId, revision: next })
      .where(eq(letters.id, id));
    await appendAudit(tx, actorOf(visit), 'letter:saved', id, { revision: next });
    return ok({ revision: next });
  });
