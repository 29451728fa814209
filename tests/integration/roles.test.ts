import pg from 'pg';
import PgBoss from 'pg-boss';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';

let database: TestDatabase;
let client: pg.Client;

beforeAll(async () => {
  database = await createTestDatabase();
  client = new pg.Client({ connectionString: database.url });
  await client.connect();
});

afterAll(async () => {
  await client?.end();
  await database?.drop();
});

const refused = { code: '42501' };

describe("the application's role", () => {
  it('owns no table of the record', async () => {
    const { rows } = await client.query(
      "select tablename from pg_tables where schemaname = 'public' and tableowner = current_user",
    );
    expect(rows).toEqual([]);
  });

  it('cannot change the shape of the tables, nor make one beside them', async () => {
    await expect(client.query('alter table units add column extra text')).rejects.toMatchObject(refused);
    await expect(client.query('drop table units cascade')).rejects.toMatchObject(refused);
    await expect(client.query('truncate units cascade')).rejects.toMatchObject(refused);
    await expect(client.query('create table public.extra (id int)')).rejects.toMatchObject(refused);
  });

  it('is neither superuser nor able to become the owner', async () => {
    const { rows } = await client.query(
      'select rolsuper, rolcreaterole, rolcreatedb from pg_roles where rolname = current_user',
    );
    expect(rows).toEqual([{ rolsuper: false, rolcreaterole: false, rolcreatedb: false }]);
    await expect(client.query('set role buckram_owner')).rejects.toMatchObject(refused);
  });

  it('may set up the schema of the job queue, its own', async () => {
    const boss = new PgBoss({ connectionString: database.url, max: 2 });
    await boss.start();
    await boss.createQueue('letters');
    await boss.stop({ graceful: false });
  });

  it('has no right on a table that no migration has given it', async () => {
    const owner = new pg.Client({ connectionString: database.ownerUrl });
    await owner.connect();
    await owner.query('create table unforeseen (id int)');
    await owner.end();
    await expect(client.query('select * from unforeseen')).rejects.toMatchObject(refused);
  });
});

describe('a test database', () => {
  it('is its own: what one holds, another does not', async () => {
    const other = await createTestDatabase();
    const owner = new pg.Client({ connectionString: other.ownerUrl });
    await owner.connect();
    await owner.query('create table only_here (id int)');
    await owner.end();
    await other.drop();
    const { rows } = await client.query("select to_regclass('public.only_here') as found");
    expect(rows).toEqual([{ found: null }]);
  });
});
