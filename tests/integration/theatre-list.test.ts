import { and, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditLog, caseRevisions, cases } from '../../src/db/schema.ts';
import { actorOf, type Visit } from '../../src/server/accounts/visit.ts';
import { database } from '../../src/server/database.ts';
import { answerListForm } from '../../src/server/theatre-list/form.ts';
import { addCases, casesOn, nextPosition } from '../../src/server/theatre-list/list.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { endWork, visitAs, workOn } from '../support/desk.ts';

let on: TestDatabase;
let secretary: Visit;

beforeAll(async () => {
  on = await createTestDatabase({ demonstration: true });
  workOn(on);
  secretary = await visitAs('secretary');
});

afterAll(async () => {
  await endWork();
  await on.drop();
});

const formOf = (
  fields: Readonly<Record<string, string | Blob>>,
  planned: readonly string[] = [],
): FormData => {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.append(name, value);
  for (const one of planned) form.append('planned', one);
  return form;
};

const byHand = {
  form: 'add',
  date: '2026-12-10',
  position: '1',
  'family name': 'Farrow',
  'given name': 'Ivo',
  'date of birth': '1955-05-05',
  'record number': 'DEMO-50001',
  eye: 'right',
  allergies: 'none',
};

const header = 'date,position,record number,family name,given name,date of birth,eye,planned procedures';
const csvOf = (...lines: string[]) => new File([[header, ...lines].join('\n')], 'list.csv');
const upload = (fields: Readonly<Record<string, string | Blob>>) =>
  answerListForm(secretary, formOf({ form: 'upload', ...fields }));
const on10 = () => casesOn(database(), secretary.unit.id, '2026-12-10');

describe('a case by hand', () => {
  it('stands on the list of its day with its first revision and an entry in the log', async () => {
    const answer = await answerListForm(secretary, formOf(byHand, ['vitrectomy', 'gas']));
    expect(answer).toEqual({ kind: 'added', day: '2026-12-10', added: 1, alreadyThere: 0 });
    const [line] = await on10();
    expect(line).toMatchObject({ patient: 'Farrow, Ivo', eye: 'right', state: 'draft', begun: 1 });
    expect(line?.planned).toEqual(['vitrectomy', 'gas']);
    const id = line?.id ?? '';
    const kept = await database().select().from(caseRevisions).where(eq(caseRevisions.caseId, id));
    expect(kept).toMatchObject([{ revision: 1, savedBy: secretary.person.id }]);
    const logged = and(eq(auditLog.action, 'case:listed'), eq(auditLog.subject, id));
    const [entry] = await database().select().from(auditLog).where(logged);
    expect(entry?.detail).toEqual({ listDate: '2026-12-10' });
    expect(await nextPosition(database(), secretary.unit.id, '2026-12-10')).toBe(2);
  });

  it('is refused with a reason for each field, and what was typed', async () => {
    const answer = await answerListForm(
      secretary,
      formOf({ ...byHand, 'date of birth': '1955-02-30', eye: '', 'record number': '' }),
    );
    expect(answer).toMatchObject({ kind: 'refused', row: { cells: { 'family name': 'Farrow' } } });
    const columns = answer.kind === 'refused' ? answer.row.errors.map(({ column }) => column).sort() : [];
    expect(columns).toEqual(['date of birth', 'eye', 'record number']);
  });

  it('is added once though two people add it at the same moment', async () => {
    const twin = { ...byHand, 'record number': 'DEMO-50002' };
    const answers = await Promise.all([1, 2, 3].map(() => answerListForm(secretary, formOf(twin))));
    expect(answers.map((answer) => (answer.kind === 'added' ? answer.added : -1)).sort()).toEqual([0, 0, 1]);
    expect((await on10()).filter(({ number }) => number === 'DEMO-50002')).toHaveLength(1);
  });
});

describe('an uploaded list', () => {
  const sound = '2026-12-11,1,DEMO-60001,Müller,Änne,1960-01-01,left,vitrectomy; gas tamponade';
  const wrong = '2026-12-11,2,DEMO-60002,Farrow,Ada,1960-01-01,both,';
  const on11 = () => casesOn(database(), secretary.unit.id, '2026-12-11');

  it('is shown before anything is added, and then adds what was shown as ready', async () => {
    const shown = await upload({ file: csvOf(sound, wrong) });
    if (shown.kind !== 'preview') throw new Error(shown.kind);
    expect(shown.list.rows.map(({ errors }) => errors.length)).toEqual([0, 1]);
    expect(await on11()).toEqual([]);
    expect(await upload({ csv: shown.csv, confirmed: 'yes' })).toMatchObject({ kind: 'added', added: 1 });
    expect((await on11()).map(({ patient }) => patient)).toEqual(['Müller, Änne']);
  });

  it('tells in the preview which cases are there already, and adds none twice', async () => {
    const again = await upload({ file: csvOf(sound) });
    expect(again.kind === 'preview' && [...again.there]).toEqual([2]);
    expect(await upload({ file: csvOf(sound), confirmed: 'yes' })).toMatchObject({
      added: 0,
      alreadyThere: 1,
    });
  });

  it('is read in the code page that older spreadsheets write', async () => {
    const bytes = Buffer.from([header, sound.replace('60001', '60003')].join('\n'), 'latin1');
    const shown = await upload({ file: new File([bytes], 'list.csv') });
    expect(shown.kind === 'preview' && shown.list.rows[0]?.cells['family name']).toBe('Müller');
  });

  it('is refused whole rather than cut short', async () => {
    const lines = Array.from({ length: 4000 }, (_, at) => sound.replace('60001', `7${at}`));
    expect(await upload({ file: csvOf(...lines) })).toMatchObject({ kind: 'unreadable' });
    expect(
      await upload({ file: new File([new Uint8Array([80, 75, 3, 4, 0, 0])], 'list.xlsx') }),
    ).toMatchObject({
      kind: 'unreadable',
    });
  });

  it('leaves nothing behind when one of its cases cannot be kept', async () => {
    const listDate = '2026-12-12';
    const record = { version: 1 as const, who: { eye: 'left' as const } };
    const nobodysDay = 'no day';
    const adding = addCases(database(), actorOf(secretary), [
      { listDate, position: 1, record },
      { listDate: nobodysDay, position: 2, record },
    ]);
    await expect(adding).rejects.toThrow();
    expect(await database().select().from(cases).where(eq(cases.listDate, listDate))).toEqual([]);
  });
});
