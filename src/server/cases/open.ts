import type { Database } from '../../db/client.ts';
import { may } from '../../domain/access/policy.ts';
import type { CaseSigned, CaseView } from '../../domain/api.ts';
import type { Settings } from '../../domain/checks/engine.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { appendAudit } from '../audit/log.ts';
import { localDay } from '../local-day.ts';
import { settingsOf } from '../practice/check-settings.ts';
import { readSigned, signedOf } from '../signing/signed-version.ts';
import { loadCase, viewOf } from './load.ts';

export interface OpenedCase {
  view: CaseView;
  signed: CaseSigned | null;
  /** Today at the unit, YYYY-MM-DD. */
  today: string;
  /** What the unit has settled about its cautions. */
  settings: Settings;
}

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/**
 * A case as its page shows it: the draft, or what was signed, whose reading is entered in the log. `undefined` when there
 * is no such case in the unit, or none that this person may read.
 */
export const openCase = async (db: Database, visit: Visit, id: string): Promise<OpenedCase | undefined> => {
  const row = UUID.test(id) ? await loadCase(db, visit.unit.id, id) : undefined;
  if (row === undefined) return undefined;
  const today = localDay();
  const { roles } = visit.person;
  if (row.state === 'draft') {
    if (!may(roles, 'case:read-draft', row.state)) return undefined;
    return { view: viewOf(row), signed: null, today, settings: await settingsOf(db, visit.unit.id) };
  }
  const found = await readSigned(db, visit.unit.id, { caseId: id });
  if (found === undefined || !may(roles, 'signed:read', row.state)) return undefined;
  await db.transaction((tx) => appendAudit(tx, actorOf(visit), 'note:read', found.row.id));
  const { record, sheet, answers } = found.note;
  return {
    view: { ...viewOf(row), record, sheet, answers },
    signed: signedOf(found.row),
    today,
    settings: found.note.settings,
  };
};
