import { and, asc, eq, max, sql } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { caseRevisions, cases, people, units } from '../../db/schema.ts';
import type { CaseState } from '../../domain/access/policy.ts';
import type { CaseRecord, Eye } from '../../domain/record/schema.ts';
import type { ListedCase } from '../../domain/theatre-list/read-csv.ts';
import { type Actor, appendAudit } from '../audit/log.ts';

export interface ListLine {
  id: string;
  position: number;
  state: CaseState;
  patient: string;
  dateOfBirth?: string;
  number?: string;
  eye?: Eye;
  planned: string[];
  surgeon: string | null;
  /** Stages of the record that hold anything, of eleven. */
  begun: number;
}

const lineOf = (row: {
  id: string;
  position: number;
  state: CaseState;
  record: CaseRecord;
  surgeon: string | null;
}): ListLine => {
  const { patient, eye, planned = [], performed } = row.record.who ?? {};
  return {
    id: row.id,
    position: row.position,
    state: row.state,
    patient: [patient?.familyName, patient?.givenName].filter((name) => name !== undefined).join(', '),
    ...(patient?.dateOfBirth === undefined ? {} : { dateOfBirth: patient.dateOfBirth }),
    ...(patient?.number === undefined ? {} : { number: patient.number }),
    ...(eye === undefined ? {} : { eye }),
    planned: performed ?? planned,
    surgeon: row.surgeon,
    begun: Object.keys(row.record).length - 1,
  };
};

/** The cases of one day, in the order of the list. */
export const casesOn = async (db: Database, unitId: string, listDate: string): Promise<ListLine[]> => {
  const rows = await db
    .select({
      id: cases.id,
      position: cases.position,
      state: cases.state,
      record: cases.record,
      surgeon: people.name,
    })
    .from(cases)
    .leftJoin(people, eq(cases.surgeonId, people.id))
    .where(and(eq(cases.unitId, unitId), eq(cases.listDate, listDate)))
    .orderBy(asc(cases.position), asc(cases.id));
  return rows.map(lineOf);
};

/** Whether the same case (day, record number and eye) is on the list. */
export const isListed = async (
  db: Database,
  unitId: string,
  { listDate, record }: ListedCase,
): Promise<boolean> => {
  const same = await db
    .select({ id: cases.id })
    .from(cases)
    .where(
      and(
        eq(cases.unitId, unitId),
        eq(cases.listDate, listDate),
        sql`${cases.record} #>> '{who,patient,number}' = ${record.who?.patient?.number ?? ''}`,
        sql`${cases.record} #>> '{who,eye}' is not distinct from ${record.who?.eye ?? null}`,
      ),
    )
    .limit(1);
  return same.length > 0;
};

/** Puts cases on the list, all or none. A case that is there already is left alone, also when two people add it at once. */
export const addCases = (
  db: Database,
  actor: Actor & { personId: string },
  listed: readonly ListedCase[],
): Promise<{ added: number; alreadyThere: number }> =>
  db.transaction(async (tx) => {
    // One at a time for a unit: who comes second sees what the first has added.
    await tx.select({ id: units.id }).from(units).where(eq(units.id, actor.unitId)).for('no key update');
    let added = 0;
    for (const one of listed) {
      if (await isListed(tx, actor.unitId, one)) continue;
      const { listDate, position, record } = one;
      const [row] = await tx
        .insert(cases)
        .values({ unitId: actor.unitId, listDate, position, record, savedBy: actor.personId })
        .returning({ id: cases.id });
      if (row === undefined) continue;
      await tx
        .insert(caseRevisions)
        .values({ caseId: row.id, revision: 1, record, answers: [], savedBy: actor.personId });
      await appendAudit(tx, actor, 'case:listed', row.id, { listDate });
      added += 1;
    }
    return { added, alreadyThere: listed.length - added };
  });

/** The place after the last case of a day. */
export const nextPosition = async (db: Database, unitId: string, listDate: string): Promise<number> => {
  const [row] = await db
    .select({ last: max(cases.position) })
    .from(cases)
    .where(and(eq(cases.unitId, unitId), eq(cases.listDate, listDate)));
  return (row?.last ?? 0) + 1;
};
