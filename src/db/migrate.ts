import { fileURLToPath } from 'node:url';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';

/** Any number will do, as long as every process that migrates this database asks for the same one. */
const migrationLock = 7_281_943;

const connectionString = process.env.MIGRATION_DATABASE_URL;
if (!connectionString) {
  console.error('MIGRATION_DATABASE_URL is missing: migrations run as the role that owns the tables.');
  process.exit(1);
}

const client = new pg.Client({ connectionString });
await client.connect();
try {
  // The migrator takes no lock of its own, and two processes may start at once.
  await client.query('select pg_advisory_lock($1)', [migrationLock]);
  await migrate(drizzle(client), {
    migrationsFolder: fileURLToPath(new URL('../../drizzle', import.meta.url)),
  });
} finally {
  await client.end();
}
