import { type ListRow, readTheatreList, type TheatreList } from '../../domain/theatre-list/read-csv.ts';
import { readListForm } from '../../domain/theatre-list/read-form.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { database } from '../database.ts';
import { addCases } from './list.ts';

export type ListAnswer =
  | { kind: 'added'; day: string; added: number; alreadyThere: number }
  | { kind: 'refused'; row: ListRow }
  | { kind: 'unreadable'; error: string }
  | { kind: 'preview'; csv: string; list: TheatreList };

const MOST = 500_000;

const readCsv = async (form: FormData): Promise<string> => {
  const kept = form.get('csv');
  if (typeof kept === 'string' && kept !== '') return kept.slice(0, MOST);
  const file = form.get('file');
  return file instanceof File ? (await file.text()).slice(0, MOST) : '';
};

const upload = async (visit: Visit, form: FormData): Promise<ListAnswer> => {
  const csv = await readCsv(form);
  const list = readTheatreList(csv);
  if (list.error !== undefined) return { kind: 'unreadable', error: list.error };
  const sound = list.rows.flatMap((row) => (row.case === undefined ? [] : [row.case]));
  const [first] = sound;
  if (form.get('confirmed') !== 'yes' || first === undefined) return { kind: 'preview', csv, list };
  return { kind: 'added', day: first.listDate, ...(await addCases(database(), actorOf(visit), sound)) };
};

/** What the theatre list's two forms ask for: one case by hand, or a file with a preview first. */
export const answerListForm = async (visit: Visit, form: FormData): Promise<ListAnswer> => {
  if (form.get('form') === 'upload') return upload(visit, form);
  const texts = Object.fromEntries(
    [...form].flatMap(([name, value]) => (typeof value === 'string' ? [[name, value]] : [])),
  );
  const row = readListForm(texts, form.getAll('planned').map(String));
  if (row.case === undefined) return { kind: 'refused', row };
  return {
    kind: 'added',
    day: row.case.listDate,
    ...(await addCases(database(), actorOf(visit), [row.case])),
  };
};
