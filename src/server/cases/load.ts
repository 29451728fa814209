import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases } from '../../db/schema.ts';
import type { CaseView } from '../../domain/api.ts';

type CaseRow = typeof cases.$inferSelect;

export const viewOf = (row: CaseRow): CaseView => ({
  id: row.id,
  state: row.state,
  revision: row.revision,
  record: row.record,
  sheet: row.sheet,
  answers: row.answers,
  savedAt: row.savedAt.toISOString(),
});

/** A case of this unit. */
export const loadCase = async (db: Database, unitId: string, id: string): Promise<CaseRow | undefined> => {
  const [row] = await db
    .select()
    .from(cases)
    .where(and(eq(cases.id, id), eq(cases.unitId, unitId)));
  return row;
};

/** The same, locked until the transaction ends. */
export const lockCase = async (tx: Database, unitId: string, id: string): Promise<CaseRow | undefined> => {
  const [row] = await tx
    .select()
    .from(cases)
    .where(and(eq(cases.id, id), eq(cases.unitId, unitId)))
    .for('update');
  return row;
};
