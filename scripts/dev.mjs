import { spawn } from 'node:child_process';
import { astro, astroEnvironment } from './lib/build.mjs';
import { prepare } from './lib/prepare.mjs';
import { createStarted, projectFolder, runMain, say } from './lib/process.mjs';

const started = createStarted();

runMain(started, async () => {
  const { config, mailFolder } = await prepare(started);
  if (mailFolder !== undefined) say(`Letters are caught, not sent; each is kept in ${mailFolder}`);
  const { MIGRATION_DATABASE_URL: _, ...env } = astroEnvironment();
  const server = spawn(
    process.execPath,
    [...astro, 'dev', '--host', config.host, '--port', String(config.port)],
    { cwd: projectFolder, env, stdio: ['ignore', 'inherit', 'inherit'] },
  );
  const ended = new Promise((resolve) => server.once('exit', (code) => resolve(code ?? 0)));
  started.add(async () => {
    server.kill('SIGTERM');
    await ended;
  });
  return Number(await ended);
});
