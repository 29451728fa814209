import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder, run, Stop, say } from './process.mjs';

/** @typedef {{ packages?: Record<string, { version?: string, optional?: boolean, link?: boolean }> }} LockFile */

/**
 * @param {string} path
 * @returns {Required<LockFile>['packages'] | undefined}
 */
const packagesIn = (path) => {
  const full = join(projectFolder, path);
  if (!existsSync(full)) return undefined;
  /** @type {LockFile} */
  const lock = JSON.parse(readFileSync(full, 'utf8'));
  return lock.packages;
};

/**
 * npm writes the inner lock file at the end of an installation, so that it tells what is really there;
 * packages for other machines are left out of it.
 */
const installedAsLocked = () => {
  const wanted = packagesIn('package-lock.json') ?? {};
  const present = packagesIn('node_modules/.package-lock.json');
  if (present === undefined) return false;
  const missing = Object.entries(wanted).some(
    ([path, entry]) =>
      path !== '' &&
      present[path]?.version !== entry.version &&
      !(entry.optional && present[path] === undefined),
  );
  return !missing && Object.keys(present).every((path) => wanted[path] !== undefined);
};

/** Runs `npm ci` when what is installed is not what package-lock.json says. */
export const ensureDependencies = async () => {
  if (installedAsLocked()) return;
  say('Installing the dependencies (npm ci, about a minute)...');
  const { NODE_ENV: _, ...env } = process.env;
  const result = await run('npm', ['ci', '--no-audit', '--no-fund'], { env, quiet: true });
  if (result.code !== 0) {
    throw new Stop(`${result.output.trim()}\n\nThe dependencies could not be installed; npm says why above.`);
  }
};

/** @throws {Stop} on a Node.js that the dependencies do not run on */
export const checkNode = () => {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19) {
    throw new Stop(`Buckram runs on Node.js 20.19 or a later 20; this is ${process.versions.node}.`);
  }
};
