import { asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { checkSettings, people } from '../../db/schema.ts';
import type { Settings } from '../../domain/checks/engine.ts';
import { rules } from '../../domain/checks/registry.ts';
import { fail, ok, type Result } from '../../domain/result.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { database } from '../database.ts';

export interface Settled {
  rule: string;
  setting: 'caution' | 'omission' | 'off';
  reason: string;
  by: string;
  at: Date;
}

/** Everything that a unit ever settled about its cautions, the oldest first. */
export const settledHistory = (db: Database, unitId: string): Promise<Settled[]> =>
  db
    .select({
      rule: checkSettings.rule,
      setting: checkSettings.setting,
      reason: checkSettings.reason,
      by: people.name,
      at: checkSettings.settledAt,
    })
    .from(checkSettings)
    .innerJoin(people, eq(checkSettings.settledBy, people.id))
    .where(eq(checkSettings.unitId, unitId))
    .orderBy(asc(checkSettings.id));

/** What counts now: the latest decision on each rule. */
export const settingsOf = async (db: Database, unitId: string): Promise<Settings> => {
  const rows = await db
    .select({ rule: checkSettings.rule, setting: checkSettings.setting })
    .from(checkSettings)
    .where(eq(checkSettings.unitId, unitId))
    .orderBy(asc(checkSettings.id));
  const latest = new Map(rows.map(({ rule, setting }) => [rule, setting]));
  return Object.fromEntries(
    [...latest].flatMap(([rule, setting]) => (setting === 'caution' ? [] : [[rule, setting] as const])),
  );
};

/** Takes a caution as an omission, switches it off, or back; always with a reason. Nothing else can be settled. */
export const settle = async (
  visit: Visit,
  rule: string,
  setting: string,
  reason: string,
): Promise<Result<null>> => {
  const chosen = (['caution', 'omission', 'off'] as const).find((one) => one === setting);
  const isCaution = rules.some(({ id, level }) => id === rule && level === 'caution');
  if (chosen === undefined || !isCaution)
    return fail('invalid', 'Only a caution can be settled by the unit.');
  if (reason.trim().length < 3) return fail('invalid', 'Write why; it is kept with the decision.');
  await database().transaction(async (tx) => {
    const row = {
      unitId: visit.unit.id,
      rule,
      setting: chosen,
      reason: reason.trim().slice(0, 1000),
      settledBy: visit.person.id,
    };
    await tx.insert(checkSettings).values(row);
    await appendAudit(tx, actorOf(visit), 'checks:settled', visit.unit.id, { rule, setting: chosen });
  });
  return ok(null);
};
