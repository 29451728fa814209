import { and, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases, letters, signedVersions, units } from '../../db/schema.ts';
import { type Actor, appendAudit } from '../audit/log.ts';
import { config } from '../config.ts';
import { documentName } from '../documents/document-name.ts';
import { deliver, openTransport } from '../mail/deliver.ts';

export type Sending = 'sent' | 'failed' | 'try-again' | 'nothing-to-do';

/**
 * Sends one queued letter. The row stays locked while the mail server is spoken to, so that two workers never
 * send the same letter; whoever comes second finds it done. If this process dies in between, the letter is still queued
 * and goes again under the same Message-ID.
 */
export const sendLetter = (db: Database, letterId: string, lastTry: boolean): Promise<Sending> =>
  db.transaction(async (tx) => {
    const [letter] = await tx
      .select()
      .from(letters)
      .where(and(eq(letters.id, letterId), eq(letters.state, 'queued')))
      .for('update', { skipLocked: true });
    if (letter === undefined || letter.docx === null || letter.sentTo === null) return 'nothing-to-do';
    const [place] = await tx
      .select({ unitId: units.id, unit: units.name, code: signedVersions.verificationCode })
      .from(signedVersions)
      .innerJoin(cases, eq(signedVersions.caseId, cases.id))
      .innerJoin(units, eq(cases.unitId, units.id))
      .where(eq(signedVersions.id, letter.signedVersionId));
    if (place === undefined) return 'nothing-to-do';
    const { mailFrom, smtpUrl } = config();
    const transport = openTransport(smtpUrl);
    const result = await deliver(transport, {
      messageId: letter.messageId,
      from: mailFrom,
      to: letter.sentTo,
      subject: `Letter from ${place.unit}`,
      text: `Dear colleague,\n\na letter from ${place.unit} is attached.\n\nIf it is not meant for you, please delete it and tell us.\n`,
      attachment: { filename: documentName('letter', place.code), content: letter.docx },
    });
    transport.close();
    const actor: Actor = { personId: null, unitId: place.unitId };
    const attempts = letter.attempts + 1;
    if (result.ok) {
      await tx
        .update(letters)
        .set({ state: 'sent', attempts, sentAt: new Date(), lastError: null })
        .where(eq(letters.id, letterId));
      await appendAudit(tx, actor, 'letter:sent', letterId, { attempts, messageId: letter.messageId });
      return 'sent';
    }
    const givenUp = lastTry || result.error.kind === 'permanent';
    await tx
      .update(letters)
      .set({ state: givenUp ? 'failed' : 'queued', attempts, lastError: result.error.message })
      .where(eq(letters.id, letterId));
    if (givenUp) await appendAudit(tx, actor, 'letter:failed', letterId, { attempts });
    return givenUp ? 'failed' : 'try-again';
  });

/** Letters that are queued and have no live job in this queue. */
export const forgottenLetters = async (db: Database, queue: string): Promise<string[]> => {
  const { rows } = await db.execute<{ id: string }>(sql`
    select id from letters
    where state = 'queued' and not exists (
      select from pgboss.job
      where name = ${queue} and singleton_key = letters.id::text and state in ('created', 'retry', 'active')
    )
    order by queued_at, id`);
  return rows.map(({ id }) => id);
};
