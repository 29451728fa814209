import { fail, ok, type Result } from '../../domain/result.ts';
import { type ListRow, readTheatreList, type TheatreList } from '../../domain/theatre-list/read-csv.ts';
import { readListForm } from '../../domain/theatre-list/read-form.ts';
import { actorOf, type Visit } from '../accounts/visit.ts';
import { database } from '../database.ts';
import { addCases, isListed } from './list.ts';

export interface Preview {
  kind: 'preview';
  csv: string;
  list: TheatreList;
  /** Lines of the file whose case is on the list already. */
  there: ReadonlySet<number>;
}

export type ListAnswer =
  | { kind: 'added'; day: string; added: number; alreadyThere: number }
  | { kind: 'refused'; row: ListRow }
  | { kind: 'unreadable'; error: string }
  | Preview;

const MOST_CHARACTERS = 200_000;

/** The text of a file: UTF-8, or else the older Western code page that spreadsheets write. */
const decode = (bytes: ArrayBuffer): string => {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
};

const readCsv = async (form: FormData): Promise<Result<string>> => {
  const kept = form.get('csv');
  const file = form.get('file');
  const csv =
    typeof kept === 'string' && kept !== ''
      ? kept
      : file instanceof File
        ? decode(await file.arrayBuffer())
        : '';
  if (csv.length > MOST_CHARACTERS)
    return fail('too-long', 'The file is too long for a theatre list. Split it up and upload the parts.');
  if (csv.includes('\0'))
    return fail('not-text', 'This is not a CSV file. Save the list as CSV and choose that file.');
  return ok(csv);
};

const upload = async (visit: Visit, form: FormData): Promise<ListAnswer> => {
  const read = await readCsv(form);
  if (!read.ok) return { kind: 'unreadable', error: read.error.message };
  const csv = read.value;
  const list = readTheatreList(csv);
  if (list.error !== undefined) return { kind: 'unreadable', error: list.error };
  const sound = list.rows.flatMap((row) => (row.case === undefined ? [] : [row.case]));
  const [first] = sound;
  if (form.get('confirmed') === 'yes' && first !== undefined)
    return { kind: 'added', day: first.listDate, ...(await addCases(database(), actorOf(visit), sound)) };
  const there = new Set<number>();
  for (const row of list.rows)
    if (row.case !== undefined && (await isListed(database(), visit.unit.id, row.case))) there.add(row.line);
  return { kind: 'preview', csv, list, there };
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
