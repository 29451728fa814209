import { createHash, generateKeyPairSync, randomBytes } from 'node:crypto';
import { chmodSync, existsSync, mkdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { databaseAccount } from './cluster.mjs';
import { projectFolder, Stop } from './process.mjs';

/**
 * What is made up once and kept, readable by this account alone.
 * @typedef {object} Kept
 * @property {number} port of the private database; 0 until one was chosen
 * @property {import('./cluster.mjs').Passwords} passwords
 */

/**
 * @param {string} folder
 * @param {number} uid
 */
const reachableBy = (folder, uid) => {
  for (let at = resolve(folder); ; at = dirname(at)) {
    if (existsSync(at)) {
      const { mode, uid: owner } = statSync(at);
      if ((mode & 0o001) === 0 && !(owner === uid && (mode & 0o100) !== 0)) return false;
    }
    if (at === dirname(at)) return true;
  }
};

/**
 * The folder that keeps everything between starts. PostgreSQL refuses to run as root; what it runs as instead must be able
 * to reach its files, which it cannot under root's home.
 * @returns {string}
 */
export const chooseDataFolder = () => {
  const own = resolve(projectFolder, process.env.DATA_FOLDER || '.buckram');
  const account = databaseAccount();
  if (account.uid === undefined || reachableBy(own, account.uid)) return own;
  if (process.env.DATA_FOLDER) {
    throw new Stop(
      `DATA_FOLDER (${own}) cannot be reached by the account "postgres"; choose a folder that it can enter.`,
    );
  }
  return `/var/lib/buckram/${createHash('sha256').update(projectFolder).digest('hex').slice(0, 12)}`;
};

/**
 * @param {string} folder
 * @returns {{ kept: Kept, keep: (kept: Kept) => void, mailFolder: string, keyFolder: string }}
 */
export const openDataFolder = (folder) => {
  const mailFolder = join(folder, 'mail');
  const keyFolder = join(folder, 'keys');
  try {
    mkdirSync(folder, { recursive: true, mode: 0o755 });
    chmodSync(folder, 0o755);
    for (const one of [mailFolder, keyFolder]) mkdirSync(one, { recursive: true, mode: 0o700 });
  } catch {
    throw new Stop(
      `The data folder ${folder} cannot be written. Was it made by another account? Set DATA_FOLDER to another one.`,
    );
  }

  const file = join(folder, 'private.json');
  /** @param {Kept} kept */
  const keep = (kept) => {
    writeFileSync(file, `${JSON.stringify(kept, null, 2)}\n`, { mode: 0o600 });
  };
  const password = () => randomBytes(24).toString('base64url');
  /** @type {Kept} */
  const kept = existsSync(file)
    ? JSON.parse(readFileSync(file, 'utf8'))
    : { port: 0, passwords: { superuser: password(), owner: password(), app: password() } };
  keep(kept);
  return { kept, keep, mailFolder, keyFolder };
};

/**
 * Makes the Ed25519 key that signed notes are sealed with, unless the folder has one.
 * @param {string} keyFolder
 */
export const ensureSigningKey = (keyFolder) => {
  const file = join(keyFolder, 'signing-key.pem');
  if (existsSync(file)) return;
  const { privateKey } = generateKeyPairSync('ed25519');
  writeFileSync(file, privateKey.export({ type: 'pkcs8', format: 'pem' }), { mode: 0o600 });
};
