import { randomBytes } from 'node:crypto';
import { chmodSync, existsSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startCluster } from './cluster.mjs';
import { projectFolder, runTypeScript, Stop } from './process.mjs';

/*
 * The tests' own PostgreSQL: a migrated template, a second one with the demonstration unit in it, and one ready copy. Each test file
 * copies a template for itself (tests/support/database.ts).
 */
export const template = 'buckram_template';
export const demonstrationTemplate = 'buckram_demonstration';

/**
 * @param {string} script
 * @param {NodeJS.ProcessEnv} env
 */
const runOrStop = async (script, env) => {
  const result = await runTypeScript(script, [], { env: { ...process.env, ...env }, quiet: true });
  if (result.code !== 0)
    throw new Stop(`${result.output.trim()}\n\n${script} failed on the tests' database.`);
};

/**
 * @param {import('./process.mjs').Started} started
 * @returns {Promise<NodeJS.ProcessEnv>} what the tests need to know
 */
export const startTestDatabase = async (started) => {
  const folder = mkdtempSync(join(tmpdir(), 'buckram-test-'));
  chmodSync(folder, 0o755);
  const password = () => randomBytes(12).toString('hex');
  const passwords = { superuser: password(), owner: password(), app: password() };
  const cluster = await startCluster({
    folder: join(folder, 'postgres'),
    port: 0,
    superuserPassword: passwords.superuser,
    temporary: true,
  });
  started.add(cluster.stop);

  const { cloneDatabase, databaseUrls, ensureDatabase } = await import('./database.mjs');
  const { admin, owner, app } = databaseUrls(cluster.port, passwords, template);
  await ensureDatabase(admin, passwords, template);
  if (existsSync(join(projectFolder, 'drizzle'))) {
    await runOrStop('src/db/migrate.ts', { MIGRATION_DATABASE_URL: owner });
  }
  await cloneDatabase(admin, template, demonstrationTemplate);
  if (existsSync(join(projectFolder, 'src/db/seed.ts'))) {
    const urls = databaseUrls(cluster.port, passwords, demonstrationTemplate);
    await runOrStop('src/db/seed.ts', {
      DATABASE_URL: urls.app,
      MIGRATION_DATABASE_URL: urls.owner,
      DEMONSTRATION: 'true',
      SMTP_URL: 'smtp://127.0.0.1:9',
      MAIL_FROM: 'unit@example.org',
      PUBLIC_ADDRESS: 'http://127.0.0.1:4321',
      SIGNING_KEY_FOLDER: folder,
    });
  }
  return { TEST_ADMIN_URL: admin, TEST_OWNER_URL: owner, TEST_APP_URL: app };
};
