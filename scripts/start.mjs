import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { build, isBuilt } from './lib/build.mjs';
import { prepare } from './lib/prepare.mjs';
import { createStarted, projectFolder, runMain, Stop, say } from './lib/process.mjs';

const started = createStarted();

/** @typedef {{ name: string, email: string, role: string, password: string }} DemonstrationPerson */

/** @returns {Promise<DemonstrationPerson[]>} */
const demonstrationPeople = async () => {
  const file = '../src/db/demonstration.ts';
  if (!existsSync(join(projectFolder, 'scripts', file))) return [];
  const { tsImport } = await import('tsx/esm/api');
  /** @type {{ demonstrationPeople?: DemonstrationPerson[] }} */
  const module = await tsImport(file, import.meta.url);
  return module.demonstrationPeople ?? [];
};

/** @returns {Promise<void>} when the server listens */
const startServer = async () => {
  // The serving process does not own the tables, so it is not told who does.
  const { MIGRATION_DATABASE_URL: _, ...env } = process.env;
  const server = spawn(process.execPath, [join(projectFolder, 'scripts/server.mjs')], {
    cwd: projectFolder,
    env,
    detached: true,
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  const ended = new Promise((resolve) => server.once('exit', resolve));
  started.add(async () => {
    server.kill('SIGTERM');
    await ended;
  });
  await new Promise((resolve, reject) => {
    server.once('message', resolve);
    server.once('error', reject);
    server.once('exit', () => reject(new Stop('The server could not start.')));
  });
  server.once('exit', async () => {
    if (started.isStopping) return;
    console.error('The server ended by itself.');
    await started.stop();
    process.exit(1);
  });
};

runMain(started, async () => {
  const { config, mailFolder } = await prepare(started);
  if (!isBuilt()) {
    say('Building the application (about half a minute)...');
    const result = await build({ quiet: true });
    if (result.code !== 0) throw new Stop(`${result.output.trim()}\n\nThe application could not be built.`);
  }
  await startServer();

  say(`\nBuckram is ready: ${config.publicAddress}`);
  if (mailFolder !== undefined) say(`Letters are caught, not sent; each is kept in ${mailFolder}`);
  const people = config.demonstration ? await demonstrationPeople() : [];
  if (people.length > 0) {
    say('\nDemonstration sign-ins (invented people, no real patients):');
    for (const person of people) {
      say(`  ${person.role.padEnd(14)} ${person.email.padEnd(34)} ${person.password}   ${person.name}`);
    }
  }
  say('\nCtrl-C stops it.');
  return undefined;
});
