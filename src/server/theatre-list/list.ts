import { and, asc, eq, max, sql } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { cases, people } from '../../db/schema.ts';
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

/** Puts cases on the list, all or none. A case that is there already (same day, record number and eye) is left alone. */
export const addCases = (
  db: Database,
  actor: Actor,
  listed: readonly ListedCase[],
): Promise<{ added: number; alreadyThere: number }> =>
  db.transaction(async (tx) => {
    let added = 0;
    for (const { listDate, position, record } of listed) {
      const same = await tx
        .select({ id: cases.id })
        .from(cases)
        .where(
          and(
            eq(cases.unitId, actor.unitId),
            eq(cases.listDate, listDate),
            sql`${cases.record} #>> '{who,patient,number}' = ${record.who?.patient?.number ?? ''}`,
            sql`${cases.record} #>> '{who,eye}' is not distinct from ${record.who?.eye ?? null}`,
          ),
        );
      if (same.length > 0) continue;
      const [row] = await tx
        .insert(cases)
        .values({ unitId: actor.unitId, listDate, position, record, savedBy: actor.personId })
        .returning({ id: cases.id });
      if (row !== undefined) {
        await appendAudit(tx, actor, 'case:listed', row.id, { listDate });
        added += 1;
      }
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
