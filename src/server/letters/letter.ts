import { and, asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases, letters, recipients, signedVersions } from '../../db/schema.ts';
import type { Sheet } from '../../domain/drafting/sheet.ts';
import type { ProseFinding } from '../../domain/prose/finding.ts';
import { readProse } from '../../domain/prose/read.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import type { FrozenNote } from '../../domain/signing/frozen.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { letterDocx } from '../documents/letter-docx.ts';
import { localDay } from '../local-day.ts';

type LetterRow = typeof letters.$inferSelect;
type RecipientRow = typeof recipients.$inferSelect;

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

/** Words of a letter that the signed facts deny, by statement. What was drafted from them cannot. */
export const deniedIn = (sheet: Sheet, record: CaseRecord): { statement: string; found: ProseFinding[] }[] =>
  sheet.sections.flatMap(({ statements }) =>
    statements.flatMap(({ id, origin, text }) => {
      const found = origin === 'drafted' || origin === 'deleted' ? [] : readProse(text, record);
      return found.length === 0 ? [] : [{ statement: id, found }];
    }),
  );

/** Everybody in the directory, by name; only whom somebody confirmed can be written to. */
export const recipientsOf = (db: Database, unitId: string): Promise<RecipientRow[]> =>
  db
    .select()
    .from(recipients)
    .where(and(eq(recipients.unitId, unitId), eq(recipients.active, true)))
    .orderBy(asc(recipients.name), asc(recipients.id));

/** Whom the record names as this letter's reader; shown as a suggestion with that reason, never chosen for anybody. */
export const namedReader = ({ letter, note }: OpenLetter): string | undefined =>
  letter.kind === 'family-doctor'
    ? note.record.who?.familyDoctor
    : letter.kind === 'referring-doctor'
      ? note.record.who?.referrer?.name
      : undefined;

const stale = () =>
  fail('stale', 'Somebody changed this letter meanwhile. Your words are still here; reload to see theirs.');
const notWaiting = () =>
  fail('not-waiting', 'This letter is on its way or sent. It can no longer be changed.');
const missing = () => fail('not-found', 'There is no such letter.');

const isOpen = ({ state }: LetterRow) => state === 'waiting' || state === 'failed';

/** Keeps the secretary's words and choice of reader upon a revision. */
export const saveLetter = (
  visit: Visit,
  id: string,
  revision: number,
  change: { sheet: Sheet; recipientId: string | null },
): Promise<Result<{ revision: number }>> =>
  database().transaction(async (tx) => {
    const found = await find(tx, visit.unit.id, id, true);
    if (found === undefined) return missing();
    if (!isOpen(found.letter)) return notWaiting();
    if (found.letter.revision !== revision) return stale();
    const next = revision + 1;
    await tx
      .update(letters)
      .set({ ...change, revision: next })
      .where(eq(letters.id, id));
    await appendAudit(tx, actorOf(visit), 'letter:saved', id, { revision: next });
    return ok({ revision: next });
  });

const addressOf = ({ name, practice, address }: RecipientRow): string[] => [
  name,
  practice,
  ...address.split('\n'),
];

export const documentOf = (
  { note, letter, code }: OpenLetter,
  reader: RecipientRow | undefined,
): Promise<Uint8Array> =>
  letterDocx({
    note,
    code,
    sheet: letter.sheet,
    recipient: reader === undefined ? [] : addressOf(reader),
    on: localDay(letter.queuedAt ?? new Date()),
  });

/**
 * Freezes a letter and puts it in the queue: only to a confirmed address, only when nothing in it is denied by the signed facts, only
 * once. The caller asks for the sending after the commit.
 */
export const queueLetter = (visit: Visit, id: string, revision: number): Promise<Result<null>> =>
  database().transaction(async (tx) => {
    const found = await find(tx, visit.unit.id, id, true);
    if (found === undefined) return missing();
    const { letter, note } = found;
    if (!isOpen(letter)) return notWaiting();
    if (letter.revision !== revision) return stale();
    if (letter.recipientId === null) return fail('no-recipient', 'Choose whom the letter goes to.');
    const [reader] = await tx
      .select()
      .from(recipients)
      .where(and(eq(recipients.id, letter.recipientId), eq(recipients.unitId, visit.unit.id)));
    if (reader?.confirmedAt == null || !reader.active) {
      return fail(
        'not-confirmed',
        'Nobody has confirmed this address yet. Confirm it in the directory first.',
      );
    }
    if (deniedIn(letter.sheet, note.record).length > 0) {
      return fail('denied', 'Some words say otherwise than the signed note. Change them before sending.');
    }
    const queuedAt = new Date();
    const docx = Buffer.from(await documentOf({ ...found, letter: { ...letter, queuedAt } }, reader));
    await tx
      .update(letters)
      .set({
        state: 'queued',
        queuedAt,
        queuedBy: visit.person.id,
        sentTo: reader.email,
        docx,
        lastError: null,
      })
      .where(eq(letters.id, id));
    await appendAudit(tx, actorOf(visit), 'letter:queued', id, { recipient: reader.id });
    return ok(null);
  });
