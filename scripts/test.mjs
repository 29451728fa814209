import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureInstalled, needs } from './lib/apt.mjs';
import { astro, astroEnvironment, build, isBuilt } from './lib/build.mjs';
import { countOf } from './lib/count.mjs';
import { checkNode, ensureDependencies } from './lib/dependencies.mjs';
import { createStarted, run, runMain, Stop, say } from './lib/process.mjs';
import { startTestDatabase } from './lib/test-database.mjs';

/**
 * @typedef {object} Step
 * @property {string} name
 * @property {import('./lib/apt.mjs').Need[]} needs
 * @property {boolean} [database]
 * @property {() => Promise<import('./lib/count.mjs').Count>} work
 */

const started = createStarted();
const scratch = mkdtempSync(join(tmpdir(), 'buckram-results-'));
started.add(() => rmSync(scratch, { recursive: true, force: true }));

const given = process.argv.slice(2);
const filters = given.filter((argument) => /[/.]/.test(argument));
const names = given.filter((argument) => !filters.includes(argument));

/**
 * One check: passed when each command ends well.
 * @param {string[][]} commands arguments of Node
 */
const check = async (...commands) => {
  let failed = 0;
  for (const command of commands) {
    const result = await run(process.execPath, command, { env: astroEnvironment() });
    if (result.code !== 0) failed = 1;
  }
  return { passed: 1 - failed, failed };
};

/** @param {string} project of vitest.config.ts */
const tests = async (project) => {
  const report = join(scratch, `${project}.json`);
  const { code } = await run(process.execPath, [
    'node_modules/vitest/vitest.mjs',
    'run',
    `--project=${project}`,
    '--passWithNoTests',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
    ...filters,
  ]);
  return countOf(code, () => readFileSync(report, 'utf8'));
};

const buildStep = async () => {
  if (isBuilt()) {
    say('The built application is of these sources.');
    return { passed: 1, failed: 0 };
  }
  const { code } = await build();
  return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1 };
};

const documents = [needs.libreOffice, needs.fonts, needs.poppler];

/** @type {Step[]} */
const steps = [
  {
    name: 'types',
    needs: [],
    work: () => check([...astro, 'check'], ['node_modules/typescript/bin/tsc', '--noEmit']),
  },
  { name: 'lint', needs: [], work: () => check(['node_modules/@biomejs/biome/bin/biome', 'check', '.']) },
  { name: 'imports', needs: [], work: () => check(['scripts/check-imports.mjs']) },
  { name: 'migrations', needs: [], work: () => check(['scripts/check-migrations.mjs']) },
  { name: 'build', needs: [], work: buildStep },
  { name: 'unit', needs: [], work: () => tests('unit') },
  { name: 'golden', needs: documents, work: () => tests('golden') },
  { name: 'external', needs: [], work: () => tests('external') },
  {
    name: 'integration',
    needs: [needs.postgres, ...documents],
    database: true,
    work: () => tests('integration'),
  },
  {
    name: 'browser',
    needs: [needs.postgres, needs.chromium, ...documents],
    database: true,
    work: () => tests('browser'),
  },
];

runMain(started, async () => {
  checkNode();
  const unknown = names.filter((name) => !steps.some((step) => step.name === name));
  if (unknown.length > 0) {
    throw new Stop(
      `No such step: ${unknown.join(', ')}. There are: ${steps.map((step) => step.name).join(', ')}.`,
    );
  }
  const wanted = new Set(names.includes('browser') ? [...names, 'build'] : names);
  const chosen = steps.filter((step) => wanted.size === 0 || wanted.has(step.name));
  await ensureInstalled([...new Set(chosen.flatMap((step) => step.needs))]);
  await ensureDependencies();

  // Nothing of this account's own configuration may reach the tests.
  for (const name of [
    'DATABASE_URL',
    'MIGRATION_DATABASE_URL',
    'SMTP_URL',
    'DEMONSTRATION',
    'PUBLIC_ADDRESS',
  ]) {
    delete process.env[name];
  }
  if (chosen.some((step) => step.database)) {
    say("Starting the tests' own PostgreSQL");
    Object.assign(process.env, await startTestDatabase(started));
  }

  /** @type {{ name: string, seconds: number, passed: number, failed: number }[]} */
  const results = [];
  for (const step of chosen) {
    say(`\n=== ${step.name}`);
    const begun = performance.now();
    const count = await step.work();
    results.push({ name: step.name, seconds: (performance.now() - begun) / 1000, ...count });
    if (started.isStopping) return undefined;
  }

  say('');
  for (const { name, seconds, passed, failed } of results) {
    say(
      `${name.padEnd(12)} ${seconds.toFixed(1).padStart(6)} s ${String(passed).padStart(6)} passed ${String(failed).padStart(4)} failed`,
    );
  }
  const passed = results.reduce((sum, result) => sum + result.passed, 0);
  const failed = results.reduce((sum, result) => sum + result.failed, 0);
  await started.stop();
  say(`\n${passed} passed, ${failed} failed`);
  process.exit(failed === 0 && passed > 0 ? 0 : 1);
});
