import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder, Stop } from './process.mjs';

/** Reads `.env` where there is one; what the environment says already wins. */
export const loadEnvironmentFile = () => {
  const file = join(projectFolder, '.env');
  if (existsSync(file)) process.loadEnvFile(file);
};

/**
 * @param {NodeJS.ProcessEnv} env
 * @returns {Promise<import('../../src/server/config.ts').Config>}
 * @throws {Stop} with everything that is wrong, one line each
 */
export const checkConfiguration = async (env) => {
  const { tsImport } = await import('tsx/esm/api');
  /** @type {typeof import('../../src/server/config.ts')} */
  const { readConfig } = await tsImport('../../src/server/config.ts', import.meta.url);
  const result = readConfig(env);
  if (result.ok) return result.value;
  throw new Stop(
    ['The configuration is not usable (.env.example explains each variable):', ...result.error].join(
      '\n  - ',
    ),
  );
};
