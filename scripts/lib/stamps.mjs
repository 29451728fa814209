import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { projectFolder } from './process.mjs';

/**
 * @param {import('node:crypto').Hash} hash
 * @param {string} path from the project's folder
 */
const addToHash = (hash, path) => {
  const full = join(projectFolder, path);
  if (!existsSync(full)) return;
  if (statSync(full).isDirectory()) {
    for (const name of readdirSync(full).sort()) addToHash(hash, join(path, name));
    return;
  }
  const content = readFileSync(full);
  hash.update(`${path}\0${content.length}\0`).update(content);
};

/**
 * @param {string[]} paths files and folders, from the project's folder; a missing one counts as empty
 * @returns {string} SHA-256 of their names and contents
 */
export const hashOf = (paths) => {
  const hash = createHash('sha256');
  for (const path of paths) addToHash(hash, path);
  return hash.digest('hex');
};

/** @param {string} file from the project's folder */
export const readStamp = (file) => {
  const full = join(projectFolder, file);
  return existsSync(full) ? readFileSync(full, 'utf8') : undefined;
};

/**
 * @param {string} file from the project's folder
 * @param {string} stamp
 */
export const writeStamp = (file, stamp) => {
  const full = join(projectFolder, file);
  mkdirSync(dirname(full), { recursive: true });
  writeFileSync(full, stamp);
};
