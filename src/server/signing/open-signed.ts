import type { Database } from '../../db/client.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { type Addendum, addendaOf } from './addendum.ts';
import { readSigned, type SignedNote } from './signed-version.ts';

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** A signed note for somebody to read, with what was added to it; that it was read is itself entered in the log. */
export const openSigned = async (
  db: Database,
  visit: Visit,
  id: string,
): Promise<(SignedNote & { addenda: Addendum[] }) | undefined> => {
  if (!UUID.test(id)) return undefined;
  const found = await readSigned(db, visit.unit.id, { id });
  if (found === undefined) return undefined;
  await db.transaction((tx) => appendAudit(tx, actorOf(visit), 'note:read', id));
  return { ...found, addenda: await addendaOf(db, id) };
};
