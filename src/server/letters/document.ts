import { eq } from 'drizzle-orm';
import { recipients } from '../../db/schema.ts';
import { ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { documentName } from '../documents/document-name.ts';
import { letterDocx } from '../documents/letter-docx.ts';
import { localDay } from '../local-day.ts';
import { loadLetter, missing, type OpenLetter, type RecipientRow } from './letter.ts';

const addressOf = ({ name, practice, address }: RecipientRow): string[] => [
  name,
  practice,
  ...address.split('\n').map((line) => line.trim()),
];

/** The letter as DOCX, dated the day on which it was put in the queue, or today. */
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

/** What was sent, byte for byte, or what would be sent now; that it was read is entered in the log. */
export const openDocument = async (
  visit: Visit,
  id: string,
): Promise<Result<{ name: string; docx: Uint8Array }>> => {
  const db = database();
  const found = await loadLetter(db, visit.unit.id, id);
  if (found === undefined) return missing();
  const { letter, code } = found;
  const isFrozen = letter.docx !== null && (letter.state === 'queued' || letter.state === 'sent');
  const [reader] =
    letter.recipientId === null
      ? []
      : await db.select().from(recipients).where(eq(recipients.id, letter.recipientId));
  const open = { ...found, letter: { ...letter, queuedAt: isFrozen ? letter.queuedAt : null } };
  const docx = isFrozen && letter.docx !== null ? letter.docx : await documentOf(open, reader);
  await db.transaction((tx) => appendAudit(tx, actorOf(visit), 'letter:document-read', id));
  return ok({ name: documentName('letter', code), docx });
};
