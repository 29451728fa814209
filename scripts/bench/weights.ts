import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { table } from './measure.ts';

const folder = 'dist/client/_astro';

const weight = (name: string): number => gzipSync(readFileSync(join(folder, name))).length;

const kb = (bytes: number): string => `${(bytes / 1024).toFixed(0)} KB`;

/** JavaScript of the built pages, gzipped. */
export const weights = (): void => {
  if (!existsSync(folder)) {
    console.log('\nThe application is not built; page weights are left out (npm run build).');
    return;
  }
  const scripts = readdirSync(folder).filter((name) => name.endsWith('.js'));
  const named = (part: RegExp) =>
    scripts.filter((name) => part.test(name)).reduce((sum, name) => sum + weight(name), 0);
  const react = named(/^client/);
  const shared = named(/^(?:index|read|parse)\./);
  table('JavaScript, gzipped', [
    [
      'theatre list, letters, coding, auditing, handbook, directory',
      '0 KB',
      'goal: under 30 KB without the editor',
    ],
    ['one letter', kb(react + shared + named(/^LetterPage/)), `React ${kb(react)} of it`],
    ['case page', kb(react + shared + named(/^CasePage/)), `React ${kb(react)} of it`],
    ['the editor, loaded after it', kb(named(/^SheetEditor/)), ''],
  ]);
};
