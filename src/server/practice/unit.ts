import { eq, sql } from 'drizzle-orm';
import { z } from 'zod';
import { units } from '../../db/schema.ts';
import { ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';
import { type FormErrors, readForm } from './read-form.ts';

const form = z.object({
  name: z.string().trim().min(2, 'Write the unit’s name').max(200),
  service: z.string().trim().min(2, 'Write the service').max(200),
  address: z.string().trim().min(5, 'Write the address').max(500),
  telephone: z.string().trim().min(3, 'Write the telephone number').max(50),
  email: z.string().trim().max(200).pipe(z.email('Write an e-mail address, like name@example.org')),
});

/** Changes the letterhead; notes that are signed keep the one that they were signed with. */
export const saveUnit = async (visit: Visit, sent: FormData): Promise<Result<null, FormErrors>> => {
  const read = readForm(form, sent);
  if (!read.ok) return read;
  await database().transaction(async (tx) => {
    const [row] = await tx
      .update(units)
      .set({ ...read.value, version: sql`${units.version} + 1` })
      .where(eq(units.id, visit.unit.id))
      .returning({ version: units.version });
    await appendAudit(tx, actorOf(visit), 'unit:changed', visit.unit.id, { version: row?.version ?? 0 });
  });
  return ok(null);
};
