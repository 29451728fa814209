import { randomBytes } from 'node:crypto';
import { cloneDatabase, dropDatabase } from '../../scripts/lib/database.mjs';
import { demonstrationTemplate, template } from '../../scripts/lib/test-database.mjs';

export interface TestDatabase {
  /** Signs in as the application's role. */
  url: string;
  /** Signs in as the role that owns the tables. */
  ownerUrl: string;
  /** Removes the database, whoever is still connected to it. */
  drop: () => Promise<void>;
}

const fromEnvironment = (name: string): string => {
  const value = process.env[name];
  if (value === undefined) {
    throw new Error(
      'These tests need a PostgreSQL of their own; run them as: npm test -- integration [file]',
    );
  }
  return value;
};

const inDatabase = (address: string, database: string): string => {
  const url = new URL(address);
  url.pathname = `/${database}`;
  return url.href;
};

/**
 * A fresh, migrated database for one test file: empty, or with the demonstration unit in it.
 * @throws without the PostgreSQL that `npm test` starts
 */
export const createTestDatabase = async (
  options: { demonstration?: boolean } = {},
): Promise<TestDatabase> => {
  const admin = fromEnvironment('TEST_ADMIN_URL');
  const name = `test_${randomBytes(6).toString('hex')}`;
  await cloneDatabase(admin, options.demonstration === true ? demonstrationTemplate : template, name);
  return {
    url: inDatabase(fromEnvironment('TEST_APP_URL'), name),
    ownerUrl: inDatabase(fromEnvironment('TEST_OWNER_URL'), name),
    drop: async () => {
      await dropDatabase(admin, name);
    },
  };
};
