import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder, run } from './process.mjs';
import { hashOf, readStamp, writeStamp } from './stamps.mjs';

const sources = ['src', 'templates', 'public', 'astro.config.mjs', 'tsconfig.json', 'package-lock.json'];
const stampFile = 'dist/sources.sha256';

export const astro = ['node_modules/astro/astro.js'];

/**
 * The environment that Astro's commands run in: they send nothing about this machine anywhere.
 * @returns {NodeJS.ProcessEnv}
 */
export const astroEnvironment = () => ({
  ...process.env,
  ASTRO_TELEMETRY_DISABLED: '1',
  ASTRO_DISABLE_UPDATE_CHECK: 'true',
});

export const isBuilt = () =>
  existsSync(join(projectFolder, 'dist/server/entry.mjs')) && readStamp(stampFile) === hashOf(sources);

/**
 * Builds the application.
 * @param {{ quiet?: boolean }} [options]
 */
export const build = async ({ quiet = false } = {}) => {
  const hash = hashOf(sources);
  const result = await run(process.execPath, [...astro, 'build'], { env: astroEnvironment(), quiet });
  if (result.code === 0) writeStamp(stampFile, hash);
  return result;
};
