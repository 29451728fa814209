import { and, asc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Database } from '../../db/client.ts';
import { recipients } from '../../db/schema.ts';
import { ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { type FormErrors, readForm } from './read-form.ts';

export const recipientKinds = {
  optometrist: 'optometrist',
  ophthalmologist: 'ophthalmologist',
  'family-doctor': 'family doctor',
  hospital: 'hospital',
} as const;

const form = z.object({
  name: z.string().trim().min(2, 'Write the name').max(200),
  kind: z.enum(['optometrist', 'ophthalmologist', 'family-doctor', 'hospital'], 'Choose what they are'),
  practice: z.string().trim().min(2, 'Write the practice').max(200),
  address: z.string().trim().min(5, 'Write the whole address').max(500),
  email: z.email('Write an e-mail address, like name@example.org').max(200),
});

type RecipientRow = typeof recipients.$inferSelect;

export const directory = (db: Database, unitId: string): Promise<RecipientRow[]> =>
  db
    .select()
    .from(recipients)
    .where(eq(recipients.unitId, unitId))
    .orderBy(asc(recipients.name), asc(recipients.id));

/** Adds somebody, or changes them; a changed address has to be confirmed again. */
export const saveRecipient = async (
  visit: Visit,
  id: string | undefined,
  sent: FormData,
): Promise<Result<null, FormErrors>> => {
  const read = readForm(form, sent);
  if (!read.ok) return read;
  await database().transaction(async (tx) => {
    if (id === undefined) {
      const [row] = await tx
        .insert(recipients)
        .values({ unitId: visit.unit.id, ...read.value })
        .returning({ id: recipients.id });
      if (row !== undefined) await appendAudit(tx, actorOf(visit), 'recipient:added', row.id);
      return;
    }
    const mine = and(eq(recipients.id, id), eq(recipients.unitId, visit.unit.id));
    const [before] = await tx.select().from(recipients).where(mine).for('update');
    if (before === undefined) return;
    const isSame =
      before.email === read.value.email &&
      before.address === read.value.address &&
      before.name === read.value.name;
    await tx
      .update(recipients)
      .set({
        ...read.value,
        revision: before.revision + 1,
        ...(isSame ? {} : { confirmedBy: null, confirmedAt: null }),
      })
      .where(mine);
    await appendAudit(tx, actorOf(visit), 'recipient:changed', id);
  });
  return ok(null);
};

/** Keeps who has looked at the whole address, and when. */
export const confirmRecipient = (visit: Visit, id: string, revision: number): Promise<void> =>
  database().transaction(async (tx) => {
    const [row] = await tx
      .update(recipients)
      .set({ confirmedBy: visit.person.id, confirmedAt: new Date() })
      // What was looked at is what is confirmed: a row that has changed since stays unconfirmed.
      .where(
        and(eq(recipients.id, id), eq(recipients.unitId, visit.unit.id), eq(recipients.revision, revision)),
      )
      .returning({ id: recipients.id });
    if (row !== undefined) await appendAudit(tx, actorOf(visit), 'recipient:confirmed', id);
  });
