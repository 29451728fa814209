import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { ensureInstalled, needs } from './apt.mjs';
import { startCluster } from './cluster.mjs';
import { checkConfiguration, loadEnvironmentFile } from './configuration.mjs';
import { chooseDataFolder, ensureSigningKey, openDataFolder } from './data-folder.mjs';
import { checkNode, ensureDependencies } from './dependencies.mjs';
import { portIsFree, projectFolder, runTypeScript, Stop, say } from './process.mjs';

const database = 'buckram';

/** @param {Record<string, string>} defaults */
const setDefaults = (defaults) => {
  for (const [name, value] of Object.entries(defaults)) process.env[name] ||= value;
};

/**
 * @param {import('./process.mjs').Started} started
 * @param {string} folder
 * @param {ReturnType<typeof openDataFolder>} data
 */
const startDatabase = async (started, folder, { kept, keep }) => {
  say(`Database: starting, data in ${folder}`);
  const cluster = await startCluster({
    folder: join(folder, 'postgres'),
    port: kept.port,
    superuserPassword: kept.passwords.superuser,
  });
  started.add(cluster.stop);
  keep({ ...kept, port: cluster.port });
  const { databaseUrls, ensureDatabase } = await import('./database.mjs');
  const urls = databaseUrls(cluster.port, kept.passwords, database);
  await ensureDatabase(urls.admin, kept.passwords, database);
  return urls;
};

const migrate = async () => {
  say('Database: bringing its tables up to date');
  const result = await runTypeScript('src/db/migrate.ts', [], { quiet: true });
  if (result.code !== 0)
    throw new Stop(`${result.output.trim()}\n\nThe database could not be brought up to date.`);
};

/** Fills an empty database with the demonstration unit. */
const seed = async () => {
  const script = 'src/db/seed.ts';
  if (!existsSync(join(projectFolder, script))) return;
  const { isEmpty } = await import('./database.mjs');
  if (!(await isEmpty(process.env.MIGRATION_DATABASE_URL ?? ''))) return;
  say('Database: empty; setting up the demonstration unit');
  const result = await runTypeScript(script, [], { quiet: true });
  if (result.code !== 0)
    throw new Stop(`${result.output.trim()}\n\nThe demonstration unit could not be set up.`);
};

/**
 * Everything up to a running database and mail server, for `npm start` and `npm run dev`. The environment of this process is complete
 * and checked afterwards.
 * @param {import('./process.mjs').Started} started takes what must be stopped at the end
 * @returns {Promise<{ config: import('../../src/server/config.ts').Config, mailFolder: string | undefined }>}
 */
export const prepare = async (started) => {
  checkNode();
  loadEnvironmentFile();
  setDefaults({ HOST: '127.0.0.1', PORT: '4321' });
  const { HOST: host = '', PORT: port = '' } = process.env;
  if (!(await portIsFree(host, Number(port) || 0))) {
    throw new Stop(`Port ${port} on ${host} is in use; stop what listens there, or set PORT to another one.`);
  }

  const ownDatabase = !process.env.DATABASE_URL;
  if (ownDatabase) await ensureInstalled([needs.postgres]);
  await ensureDependencies();

  // Real services must never be filled with invented patients by default.
  if (ownDatabase && !process.env.SMTP_URL) setDefaults({ DEMONSTRATION: 'true' });
  const demonstration = process.env.DEMONSTRATION === 'true';
  setDefaults({ PUBLIC_ADDRESS: `http://127.0.0.1:${port}` });
  if (demonstration) setDefaults({ MAIL_FROM: 'Demonstration unit <unit@example.org>' });

  const folder = chooseDataFolder();
  const data = openDataFolder(folder);
  if (!process.env.SIGNING_KEY_FOLDER) {
    ensureSigningKey(data.keyFolder);
    setDefaults({ SIGNING_KEY_FOLDER: data.keyFolder });
  }
  if (ownDatabase) {
    const urls = await startDatabase(started, folder, data);
    process.env.DATABASE_URL = urls.app;
    process.env.MIGRATION_DATABASE_URL = urls.owner;
  }
  const catchMail = demonstration && !process.env.SMTP_URL;
  if (catchMail) {
    const { startMailCatcher } = await import('./mail-catcher.mjs');
    const catcher = await startMailCatcher({ folder: data.mailFolder });
    started.add(catcher.stop);
    process.env.SMTP_URL = catcher.url;
  }

  const config = await checkConfiguration(process.env);
  if (config.migrationDatabaseUrl === null) {
    throw new Stop(
      'MIGRATION_DATABASE_URL is missing: migrations run as the role that owns the tables (.env.example).',
    );
  }
  await migrate();
  if (config.demonstration) await seed();
  return { config, mailFolder: catchMail ? data.mailFolder : undefined };
};
