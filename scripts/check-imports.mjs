import { readdirSync, readFileSync } from 'node:fs';
import { isBuiltin } from 'node:module';
import { dirname, join, normalize } from 'node:path';
import { pathToFileURL } from 'node:url';
import ts from 'typescript';
import { projectFolder } from './lib/process.mjs';

/**
 * What a room may import. `rooms`: other rooms; `packages`: "any", "browser" (any package but none that touches the server's world),
 * or a list; `node`: Node's own modules.
 * @typedef {{ rooms: string[], packages: 'any' | 'browser' | string[], node: boolean }} Room
 */

/** @type {Record<string, Room>} */
export const rooms = {
  domain: { rooms: ['domain'], packages: ['zod', 'handlebars', 'canonicalize', 'papaparse'], node: false },
  db: { rooms: ['db', 'domain'], packages: ['drizzle-orm', 'pg'], node: true },
  server: { rooms: ['server', 'db', 'domain'], packages: 'any', node: true },
  components: { rooms: ['components', 'domain', 'styles'], packages: 'browser', node: false },
  layouts: { rooms: ['layouts', 'components', 'domain', 'styles'], packages: 'browser', node: false },
  styles: { rooms: ['styles'], packages: 'browser', node: false },
  pages: {
    rooms: ['pages', 'server', 'domain', 'components', 'layouts', 'styles'],
    packages: 'browser',
    node: true,
  },
};

/** Files outside every room. What fills an empty database goes through the use cases, like everything else that writes. */
const special = new Map([
  ['src/middleware.ts', 'pages'],
  ['src/env.d.ts', 'pages'],
  ['src/db/seed.ts', 'server'],
  ['src/db/demonstration.ts', 'server'],
]);

/** Packages that reach the database, the mail, the files or the process: never below pages in the browser's direction. */
const serverPackages = new Set([
  'drizzle-orm',
  'pg',
  'pg-boss',
  'pino',
  'nodemailer',
  'lucia',
  '@lucia-auth/adapter-drizzle',
  '@node-rs/argon2',
  'rate-limiter-flexible',
  'docx',
  'jszip',
  'sharp',
  'smtp-server',
]);

/** @param {string} path from the project's folder */
export const roomOf = (path) => {
  const found = special.get(path);
  if (found !== undefined) return found;
  const [, folder, ...rest] = path.split('/');
  return rest.length === 0 ? undefined : folder;
};

/** @param {string} specifier */
const packageOf = (specifier) =>
  specifier
    .split('/')
    .slice(0, specifier.startsWith('@') ? 2 : 1)
    .join('/');

/**
 * @param {string} path
 * @param {string} specifier
 * @returns {string | undefined} why it may not, or nothing
 */
export const violationOf = (path, specifier) => {
  const from = roomOf(path);
  const room = from === undefined ? undefined : rooms[from];
  if (room === undefined) return 'is in no room of the design; rooms are listed in scripts/check-imports.mjs';
  const [bare = ''] = specifier.split('?');
  if (bare.startsWith('.')) {
    const target = normalize(join(dirname(path), bare));
    const to = roomOf(target);
    if (!target.startsWith('src/')) {
      return target === 'package.json' ? undefined : `imports ${target}, outside src`;
    }
    return to !== undefined && room.rooms.includes(to) ? undefined : `${from} may not import ${to ?? target}`;
  }
  if (bare.startsWith('/')) return `imports by a path from the root: ${specifier}`;
  if (bare.startsWith('astro:')) {
    return ['pages', 'layouts'].includes(from ?? '') ? undefined : `${from} may not import ${specifier}`;
  }
  if (isBuiltin(bare)) return room.node ? undefined : `${from} may not import ${specifier}`;
  const name = packageOf(bare);
  const may =
    room.packages === 'any' ||
    (room.packages === 'browser' ? !serverPackages.has(name) : room.packages.includes(name));
  return may ? undefined : `${from} may not import ${name}`;
};

/**
 * @param {string} path
 * @param {string} text
 * @returns {string[]} everything that a file imports, re-exports or loads later
 */
export const importsOf = (path, text) => {
  if (path.endsWith('.css')) return [];
  const sources = path.endsWith('.astro')
    ? [
        /^---\n([\s\S]*?)\n---/.exec(text)?.[1] ?? '',
        ...[...text.matchAll(/<script[^>]*>([\s\S]*?)<\/script>/g)].map((match) => match[1] ?? ''),
      ]
    : [text];
  return sources.flatMap((source) =>
    ts.preProcessFile(source, true, true).importedFiles.map((imported) => imported.fileName),
  );
};

/**
 * @param {string} folder from the project's folder
 * @returns {string[]}
 */
const filesIn = (folder) =>
  readdirSync(join(projectFolder, folder), { withFileTypes: true }).flatMap((entry) => {
    const path = `${folder}/${entry.name}`;
    if (entry.isDirectory()) return filesIn(path);
    return /\.(?:[cm]?[jt]sx?|astro)$/.test(entry.name) ? [path] : [];
  });

/** @param {string} path tests stand outside the rooms, wherever they lie */
const isTest = (path) => /\.test\.tsx?$/.test(path);

const main = () => {
  const files = filesIn('src').filter((path) => !isTest(path));
  const violations = files.flatMap((path) =>
    importsOf(path, readFileSync(join(projectFolder, path), 'utf8')).flatMap((specifier) => {
      const why = violationOf(path, specifier);
      return why === undefined ? [] : [`${path}: ${why} (${specifier})`];
    }),
  );
  for (const line of violations) console.error(line);
  console.log(`${files.length} files, ${violations.length} imports against the direction`);
  process.exit(violations.length === 0 ? 0 : 1);
};

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) main();
