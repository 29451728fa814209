import Papa from 'papaparse';
import { z } from 'zod';
import { date, sides } from '../record/fields.ts';
import { procedures } from '../record/procedures.ts';
import { readRecord } from '../record/read.ts';
import { type CaseRecord, RECORD_VERSION } from '../record/schema.ts';

/** The columns of a theatre list, in the order of the example; the names are matched without regard to case. */
export const columns = [
  'date',
  'position',
  'record number',
  'family name',
  'given name',
  'date of birth',
  'eye',
  'planned procedures',
  'allergies',
  'referred by',
  'family doctor',
] as const;

type Column = (typeof columns)[number];

const required: readonly Column[] = [
  'date',
  'record number',
  'family name',
  'given name',
  'date of birth',
  'eye',
];

export interface ListedCase {
  listDate: string;
  position: number;
  record: CaseRecord;
}

export interface ListRow {
  /** Line of the file, the header being line 1. */
  line: number;
  /** What the row says, for the preview. */
  cells: Readonly<Record<Column, string>>;
  case?: ListedCase;
  errors: { column: Column; message: string }[];
}

export interface TheatreList {
  rows: ListRow[];
  /** What is wrong with the file as a whole; then there are no rows. */
  error?: string;
}

const listPosition = z.coerce.number().int().min(1).max(99);
const byLabel = new Map(
  Object.entries(procedures).flatMap(([key, label]) => [
    [key, key],
    [label.toLowerCase(), key],
  ]),
);

const splitList = (cell: string) =>
  cell
    .split(/[;+]/)
    .map((part) => part.trim())
    .filter((part) => part !== '');

const isNone = (cell: string) => /^(none|nil|no known allergies)$/i.test(cell);

const recordOf = (cells: Readonly<Record<Column, string>>, eye: string | undefined, planned: string[]) => {
  const allergies = cells.allergies;
  return {
    version: RECORD_VERSION,
    who: {
      patient: {
        familyName: cells['family name'],
        givenName: cells['given name'],
        dateOfBirth: cells['date of birth'],
        number: cells['record number'],
        ...(allergies === ''
          ? {}
          : {
              allergies: isNone(allergies)
                ? 'none'
                : splitList(allergies).map((substance) => ({ substance })),
            }),
      },
      ...(eye === undefined ? {} : { eye }),
      ...(planned.length === 0 ? {} : { planned }),
      ...(cells['referred by'] === '' ? {} : { referrer: { name: cells['referred by'] } }),
      ...(cells['family doctor'] === '' ? {} : { familyDoctor: cells['family doctor'] }),
    },
  };
};

const columnOfPath: Readonly<Record<string, Column>> = {
  'who.patient.familyName': 'family name',
  'who.patient.givenName': 'given name',
  'who.patient.dateOfBirth': 'date of birth',
  'who.patient.number': 'record number',
  'who.referrer.name': 'referred by',
  'who.familyDoctor': 'family doctor',
};

/** Reads one case; `line` is where it stands in a file. */
export const readRow = (cells: Readonly<Record<Column, string>>, line: number): ListRow => {
  const errors: ListRow['errors'] = [];
  const refuse = (column: Column, message: string) => errors.push({ column, message });
  for (const column of required) if (cells[column] === '') refuse(column, 'Missing');
  const eye = Object.keys(sides).find((side) => cells.eye.toLowerCase().replace(/ eye$/, '') === side);
  if (cells.eye !== '' && eye === undefined) refuse('eye', 'Write right or left');
  if (cells.date !== '' && !date('Date').safeParse(cells.date).success) {
    refuse('date', 'Write the date as YYYY-MM-DD');
  }
  const position = listPosition.safeParse(cells.position === '' ? line - 1 : cells.position);
  if (!position.success) refuse('position', 'Write a whole number from 1 to 99');
  const planned: string[] = [];
  for (const name of splitList(cells['planned procedures'])) {
    const key = byLabel.get(name.toLowerCase());
    if (key === undefined) refuse('planned procedures', `“${name}” is not among the procedures known here`);
    else if (!planned.includes(key)) planned.push(key);
  }
  const read = readRecord(recordOf(cells, eye, planned));
  if (!read.ok) {
    for (const issue of read.error) {
      const column = columnOfPath[issue.path] ?? 'allergies';
      if (!errors.some((error) => error.column === column)) refuse(column, issue.message);
    }
  }
  if (errors.length > 0 || !read.ok || !position.success) return { line, cells, errors };
  return { line, cells, errors, case: { listDate: cells.date, position: position.data, record: read.value } };
};

/** Reads a theatre list from CSV with a header line. Nothing is guessed: a row with an error has no case. */
export const readTheatreList = (csv: string): TheatreList => {
  const parsed = Papa.parse<string[]>(csv.replace(/^\uFEFF/, '').trim(), { skipEmptyLines: 'greedy' });
  const [header, ...lines] = parsed.data;
  if (header === undefined)
    return { rows: [], error: 'The file is empty. It needs a header line and one line a case.' };
  const open = parsed.errors.find(({ type }) => type === 'Quotes');
  if (open !== undefined) {
    const line = (open.row ?? 0) + 1;
    return { rows: [], error: `Line ${line}: a quotation mark is not closed or stands in the wrong place.` };
  }
  const names = header.map((name) => name.trim().toLowerCase());
  const missing = required.filter((column) => !names.includes(column));
  if (missing.length > 0) {
    return { rows: [], error: `The header line lacks: ${missing.join(', ')}.` };
  }
  const seen = new Map<string, number>();
  const rows = lines.map((values, index) => {
    const cells = Object.fromEntries(
      columns.map((column) => [column, (values[names.indexOf(column)] ?? '').trim()]),
    ) as Record<Column, string>;
    const row = readRow(cells, index + 2);
    if (values.length > names.length) {
      delete row.case;
      const column = columns.find((one) => one === names.at(-1)) ?? 'date';
      row.errors.push({
        column,
        message: 'This line has more cells than the header; put words with a comma in quotation marks',
      });
    }
    const key = `${cells.date} ${cells['record number']} ${cells.eye}`.toLowerCase();
    const earlier = seen.get(key);
    if (earlier === undefined) seen.set(key, row.line);
    else {
      delete row.case;
      row.errors.push({ column: 'record number', message: `The same case as on line ${earlier}` });
    }
    return row;
  });
  return rows.length === 0 ? { rows, error: 'The file has a header line but no cases.' } : { rows };
};
