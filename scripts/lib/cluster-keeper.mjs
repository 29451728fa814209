import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { databaseAccount } from './cluster.mjs';
import { run } from './process.mjs';

/*
 * Starts a PostgreSQL, says "ready", and stops it when its standard input closes: the process that started it has stopped, or has
 * been killed without a chance to tidy up. Signals are for that process to answer.
 */
for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP']))
  process.on(signal, () => undefined);
process.stdout.on('error', () => undefined);

/** @type {{ folder: string, port: number, temporary: boolean, already: boolean, program: string }} */
const { folder, port, temporary, already, program } = JSON.parse(process.argv[2] ?? '{}');
const parent = dirname(folder);
const log = join(folder, 'log.txt');
const pidFile = join(parent, 'keeper.pid');

// Lengthy logs repeat values of rows, and rows hold patients: terse ones do not.
const settings = [
  `port=${port}`,
  'listen_addresses=127.0.0.1',
  'unix_socket_directories=',
  'log_error_verbosity=terse',
  'log_min_error_statement=panic',
  ...(temporary ? ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off'] : []),
];

/** @param {string[]} args */
const control = (args) =>
  run(program, ['--pgdata', folder, '--wait', ...args], { ...databaseAccount(), cwd: '/', quiet: true });

const closed = new Promise((resolve) => {
  process.stdin.on('end', resolve).on('error', resolve).resume();
});

writeFileSync(pidFile, String(process.pid));
if (!already) {
  const options = settings.map((setting) => `-c ${setting}`).join(' ');
  const result = await control(['--log', log, '--options', options, 'start']);
  if (result.code !== 0) {
    let detail = result.output;
    try {
      detail = readFileSync(log, 'utf8').split('\n').slice(-8).join('\n');
    } catch {
      // Without a log, what pg_ctl said is all there is.
    }
    process.stdout.write(`${detail.trim()}\0`);
    rmSync(temporary ? parent : pidFile, { recursive: true, force: true });
    process.exit(1);
  }
}
process.stdout.write('ready\0');
await closed;
await control(['--mode', 'fast', 'stop']);
rmSync(temporary ? parent : pidFile, { recursive: true, force: true });
process.exit(0);
