import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Database, openDatabase } from '../../src/db/client.ts';
import { appendAudit, firstBrokenPosition } from '../../src/server/audit/log.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';

const ENTRIES = 40;
const actor = { personId: null, unitId: '' };

let database: TestDatabase;
let owner: pg.Client;
let processes: { db: Database; pool: pg.Pool }[];

beforeAll(async () => {
  database = await createTestDatabase();
  owner = new pg.Client({ connectionString: database.ownerUrl });
  await owner.connect();
  processes = [openDatabase(database.url), openDatabase(database.url)];
  await Promise.all(
    Array.from({ length: ENTRIES / 2 }).flatMap((_, index) =>
      processes.map(({ db }) =>
        db.transaction((tx) => appendAudit(tx, actor, 'case:saved', `case ${index}`, { revision: index })),
      ),
    ),
  );
});

afterAll(async () => {
  await Promise.all((processes ?? []).map(({ pool }) => pool.end()));
  await owner?.end();
  await database?.drop();
});

const theDatabase = (): Database => {
  const [first] = processes;
  if (first === undefined) throw new Error('There is no connection.');
  return first.db;
};

/** What the walk finds after a change behind the guards, which is then taken back. */
const foundAfter = async (...changes: string[]): Promise<number | null> => {
  await owner.query('create table kept as table audit_log');
  await owner.query('alter table audit_log disable trigger all');
  for (const change of changes) await owner.query(change);
  const found = await firstBrokenPosition(theDatabase());
  await owner.query('delete from audit_log');
  await owner.query('insert into audit_log table kept');
  await owner.query('alter table audit_log enable trigger all');
  await owner.query('drop table kept');
  return found;
};

describe('the chain of the log', () => {
  it('is unbroken, without a gap, whatever was done at once in several processes', async () => {
    expect(await firstBrokenPosition(theDatabase())).toBeNull();
    const { rows } = await owner.query(
      'select count(*)::int as entries, max(position)::int as last from audit_log',
    );
    expect(rows).toEqual([{ entries: ENTRIES, last: ENTRIES }]);
  });

  it('leaves nothing of what was rolled back', async () => {
    const failing = theDatabase().transaction(async (tx) => {
      await appendAudit(tx, actor, 'case:saved', 'rolled back');
      throw new Error('on purpose');
    });
    await expect(failing).rejects.toThrow('on purpose');
    const { rows } = await owner.query("select from audit_log where subject = 'rolled back'");
    expect(rows).toEqual([]);
    expect(await firstBrokenPosition(theDatabase())).toBeNull();
  });

  it.each([
    ['a changed action', 7, ["update audit_log set action = 'x' where position = 7"]],
    ['a changed time', 7, ["update audit_log set at = at + interval '1 millisecond' where position = 7"]],
    ['a changed detail', 7, [`update audit_log set detail = '{"revision":0.5}' where position = 7`]],
    ['an entry taken out', 7, ['delete from audit_log where position = 7']],
    [
      'an entry taken out and the rest moved up',
      7,
      [
        'delete from audit_log where position = 7',
        'update audit_log set position = -position where position > 7',
        'update audit_log set position = -position - 1 where position < 0',
      ],
    ],
    [
      'two entries that changed places',
      7,
      [
        'update audit_log set position = -8 where position = 7',
        'update audit_log set position = 7 where position = 8',
        'update audit_log set position = 8 where position = -8',
      ],
    ],
    ['the first entry taken out', 1, ['delete from audit_log where position = 1']],
  ])('shows %s', async (_, position, changes) => {
    expect(await foundAfter(...changes)).toBe(position);
  });
});
