import { spawn } from 'node:child_process';
import { chownSync, existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { postgresPrograms } from './apt.mjs';
import { freePort, portIsFree, run, Stop } from './process.mjs';

/** @typedef {{ superuser: string, owner: string, app: string }} Passwords */

/**
 * Whom the database runs as: this account, or "postgres" when this account is root, which PostgreSQL refuses.
 * @returns {{ uid?: number, gid?: number }}
 */
export const databaseAccount = () => {
  if (process.getuid?.() !== 0) return {};
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((one) => one.startsWith('postgres:'));
  if (line === undefined)
    throw new Stop('The account "postgres", which Debian\'s package makes, is missing.');
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
};

/** @param {string} program */
export const postgresProgram = (program) => {
  const folder = postgresPrograms();
  if (folder === undefined) throw new Stop('PostgreSQL is not installed.');
  return join(folder, program);
};

/**
 * @param {string} folder
 * @param {string} superuserPassword
 */
const initialize = async (folder, superuserPassword) => {
  const account = databaseAccount();
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const passwordFile = join(dirname(folder), 'initial-password');
  writeFileSync(passwordFile, superuserPassword, { mode: 0o600 });
  if (account.uid !== undefined && account.gid !== undefined) {
    chownSync(folder, account.uid, account.gid);
    chownSync(passwordFile, account.uid, account.gid);
  }
  const args = ['--pgdata', folder, '--username=postgres', `--pwfile=${passwordFile}`];
  args.push('--auth=scram-sha-256', '--encoding=UTF8', '--locale=C.UTF-8');
  const result = await run(postgresProgram('initdb'), args, { ...account, cwd: '/', quiet: true });
  rmSync(passwordFile, { force: true });
  if (result.code === 0) return;
  rmSync(folder, { recursive: true, force: true });
  throw new Stop(`${result.output.trim()}\n\nThe database could not be set up in ${folder}.`);
};

/** @param {string} folder */
const isRunning = async (folder) => {
  const result = await run(postgresProgram('pg_ctl'), ['--pgdata', folder, 'status'], {
    ...databaseAccount(),
    cwd: '/',
    quiet: true,
  });
  return result.code === 0;
};

/** @param {string} folder */
const hasKeeper = (folder) => {
  const file = join(dirname(folder), 'keeper.pid');
  if (!existsSync(file)) return false;
  try {
    const command = readFileSync(`/proc/${readFileSync(file, 'utf8').trim()}/cmdline`, 'utf8');
    return command.includes('cluster-keeper.mjs');
  } catch {
    return false;
  }
};

/**
 * Starts a PostgreSQL of our own on loopback, or joins the one that already runs on this folder. A keeper process stops it when
 * this process ends, however it ends; one that another start keeps is left running.
 * @param {object} options
 * @param {string} options.folder where its files are or will be; its parent folder takes the log
 * @param {number} options.port wanted; another one is taken when it is 0 or in use
 * @param {string} options.superuserPassword
 * @param {boolean} [options.temporary] for tests: no flushing to disk, and the parent folder is removed at the end
 * @returns {Promise<{ port: number, joined: boolean, stop: () => Promise<void> }>}
 */
export const startCluster = async ({ folder, port: wanted, superuserPassword, temporary = false }) => {
  if (!existsSync(join(folder, 'PG_VERSION'))) await initialize(folder, superuserPassword);
  const already = await isRunning(folder);
  if (already && hasKeeper(folder)) return { port: wanted, joined: true, stop: async () => undefined };
  const port =
    already || (wanted !== 0 && (await portIsFree('127.0.0.1', wanted))) ? wanted : await freePort();

  const keeper = spawn(
    process.execPath,
    [
      fileURLToPath(new URL('cluster-keeper.mjs', import.meta.url)),
      JSON.stringify({ folder, port, temporary, already, program: postgresProgram('pg_ctl') }),
    ],
    { detached: true, cwd: '/', stdio: ['pipe', 'pipe', 'inherit'] },
  );
  const ended = new Promise((resolve) => keeper.once('exit', resolve));
  const answer = await new Promise((resolve) => {
    let text = '';
    keeper.stdout.setEncoding('utf8').on('data', (/** @type {string} */ part) => {
      text += part;
      if (text.endsWith('\0')) resolve(text.slice(0, -1));
    });
    keeper.once('exit', () => resolve(text || 'The process that keeps the database ended.'));
  });
  if (answer !== 'ready') throw new Stop(`${answer}\n\nThe database in ${folder} could not be started.`);
  return {
    port,
    joined: false,
    stop: async () => {
      keeper.stdin.end();
      await ended;
    },
  };
};
