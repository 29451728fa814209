import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { letters, recipients } from '../../db/schema.ts';
import type { SendLetter } from '../../domain/letters/api.ts';
import { takenOut } from '../../domain/letters/words.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { documentOf } from './document.ts';
import { deniedIn, lockOpen, type OpenLetter, type RecipientRow } from './letter.ts';

const readerOf = async (
  tx: Database,
  unitId: string,
  { letter }: OpenLetter,
): Promise<RecipientRow | undefined> => {
  if (letter.recipientId === null) return undefined;
  const [reader] = await tx
    .select()
    .from(recipients)
    .where(and(eq(recipients.id, letter.recipientId), eq(recipients.unitId, unitId)));
  return reader;
};

/** What stands in the way of this letter, if anything. */
const obstacle = (
  { letter, note }: OpenLetter,
  reader: RecipientRow | undefined,
  by: SendLetter['by'],
): ReturnType<typeof fail> | undefined => {
  if (by === 'mail' && letter.kind === 'patient')
    return fail(
      'no-recipient',
      'The patient is not in the directory. Print this letter, then hand it over or post it.',
    );
  if (by === 'mail' && reader === undefined) return fail('no-recipient', 'Choose whom the letter goes to.');
  if (reader !== undefined && (reader.confirmedAt === null || !reader.active))
    return fail('not-confirmed', 'Nobody has confirmed this address yet. Confirm it in the directory first.');
  if (deniedIn(letter.sheet, note.record).length > 0)
    return fail('denied', 'Some words say otherwise than the signed note. Change them before sending.');
  return undefined;
};

/**
 * Freezes a letter: only to a confirmed address, only when nothing in it is denied by the signed facts, only once. By mail it waits in the
 * queue and the caller asks for the sending after the commit; on paper it has gone when somebody says that they have handed it over.
 */
export const queueLetter = (
  visit: Visit,
  id: string,
  revision: number,
  by: SendLetter['by'],
): Promise<Result<null>> =>
  database().transaction(async (tx) => {
    const open = await lockOpen(tx, visit.unit.id, id, revision);
    if (!open.ok) return open;
    const reader = await readerOf(tx, visit.unit.id, open.value);
    const refused = obstacle(open.value, reader, by);
    if (refused !== undefined) return refused;
    const { letter } = open.value;
    const queuedAt = new Date();
    const docx = Buffer.from(await documentOf({ ...open.value, letter: { ...letter, queuedAt } }, reader));
    const way =
      by === 'mail'
        ? { state: 'queued' as const, sentTo: reader?.email ?? null, sentAt: null }
        : { state: 'sent' as const, sentTo: null, sentAt: queuedAt };
    await tx
      .update(letters)
      .set({ ...way, queuedAt, queuedBy: visit.person.id, docx, lastError: null })
      .where(eq(letters.id, id));
    await appendAudit(tx, actorOf(visit), by === 'mail' ? 'letter:queued' : 'letter:handed-over', id, {
      ...(reader === undefined ? {} : { recipient: reader.id }),
      takenOut: takenOut(letter.sheet).length,
    });
    return ok(null);
  });
