import { existsSync, readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { run, Stop, say } from './process.mjs';

/**
 * @typedef {object} Need
 * @property {string} what in words: "PostgreSQL"
 * @property {string[]} packages Debian's names
 * @property {() => boolean} present
 */

/** @param {string} name */
const onPath = (name) =>
  (process.env.PATH ?? '').split(delimiter).some((folder) => existsSync(join(folder, name)));

/** @returns {string | undefined} the folder of the newest PostgreSQL's own programs */
export const postgresPrograms = () => {
  const root = '/usr/lib/postgresql';
  if (!existsSync(root)) return undefined;
  const version = readdirSync(root)
    .filter((name) => /^\d+$/.test(name) && existsSync(join(root, name, 'bin', 'initdb')))
    .sort((a, b) => Number(b) - Number(a))[0];
  return version === undefined ? undefined : join(root, version, 'bin');
};

/** @satisfies {Record<string, Need>} */
export const needs = {
  postgres: {
    what: 'PostgreSQL',
    packages: ['postgresql'],
    present: () => postgresPrograms() !== undefined,
  },
  chromium: { what: 'Chromium', packages: ['chromium'], present: () => onPath('chromium') },
  libreOffice: {
    what: 'LibreOffice Writer',
    packages: ['libreoffice-writer'],
    present: () => onPath('soffice'),
  },
  fonts: {
    what: 'the Liberation fonts',
    packages: ['fonts-liberation'],
    present: () =>
      existsSync('/usr/share/fonts/truetype/liberation') ||
      existsSync('/usr/share/fonts/truetype/liberation2'),
  },
  poppler: { what: 'the PDF tools', packages: ['poppler-utils'], present: () => onPath('pdftotext') },
};

const isRoot = () => process.getuid?.() === 0;

/**
 * @param {string} command
 * @param {string[]} args
 */
const asRoot = (command, args) => {
  const whole = ['env', 'DEBIAN_FRONTEND=noninteractive', command, ...args];
  const [first = 'env', ...rest] = isRoot() ? whole : ['sudo', '-n', ...whole];
  return run(first, rest, { cwd: '/', quiet: true });
};

/** @param {string[]} packages */
const aptInstall = (packages) =>
  asRoot('apt-get', ['install', '--yes', '--quiet', '--no-install-recommends', ...packages]);

/**
 * Debian's PostgreSQL package starts a database of its own on port 5432; this keeps it from doing so, for this one installation.
 * @param {string[]} packages
 */
const installPostgres = async (packages) => {
  const settings = '/etc/postgresql-common/createcluster.conf';
  const first = await aptInstall(['postgresql-common']);
  if (first.code !== 0) return first;
  await asRoot('pg_conftool', [settings, 'set', 'create_main_cluster', 'false']);
  const second = await aptInstall(packages);
  await asRoot('pg_conftool', [settings, 'remove', 'create_main_cluster']);
  return second;
};

/**
 * Installs from Debian's packages what is missing, saying so first.
 * @param {Need[]} wanted
 * @returns {Promise<void>}
 * @throws {Stop} with the command to type, when it may not or cannot
 */
export const ensureInstalled = async (wanted) => {
  const missing = wanted.filter((need) => !need.present());
  if (missing.length === 0) return;
  const words = missing.map((need) => need.what).join(', ');
  const packages = missing.flatMap((need) => need.packages);
  const byHand = `sudo apt-get update && sudo apt-get install --no-install-recommends ${packages.join(' ')}`;

  if (!onPath('apt-get')) {
    throw new Stop(`${words} is missing, and this is not Debian: install it by hand, then run this again.`);
  }
  say(`Installing from Debian's packages: ${words} (${packages.join(', ')}). This can take some minutes.`);
  const update = await asRoot('apt-get', ['update', '--quiet']);
  if (update.code !== 0 && !isRoot()) {
    throw new Stop(
      `This account may not install packages without a password. Type this, then run it again:\n  ${byHand}`,
    );
  }

  const database = missing.filter((need) => need === needs.postgres).flatMap((need) => need.packages);
  const others = packages.filter((name) => !database.includes(name));
  const results = [];
  if (database.length > 0) results.push(await installPostgres(database));
  if (others.length > 0) results.push(await aptInstall(others));
  const failed = results.find((result) => result.code !== 0);
  if (failed !== undefined) {
    throw new Stop(
      `${failed.output.trim()}\n\nThe packages could not be installed. Type this, then run it again:\n  ${byHand}`,
    );
  }
  const still = missing.filter((need) => !need.present());
  if (still.length > 0) {
    throw new Stop(`${still.map((need) => need.what).join(', ')} was installed but cannot be found.`);
  }
};
