import { cpSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder, run } from './lib/process.mjs';

/*
 * Generates migrations into a copy of ./drizzle: a schema that matches generates none. The generator also ends well and writes nothing when
 * it would have had to ask something, so that its own word that nothing changed is required too.
 */

// Inside the project, because the generator takes paths from there only.
const scratch = mkdtempSync(join(projectFolder, 'node_modules/.drift-'));
const out = join(scratch, 'drizzle');
let code = 1;
try {
  const real = join(projectFolder, 'drizzle');
  if (!existsSync(real)) {
    console.error('There is no drizzle folder; run: npx drizzle-kit generate');
  } else {
    cpSync(real, out, { recursive: true });
    const before = readdirSync(out).length;
    const result = await run(
      process.execPath,
      [
        'node_modules/drizzle-kit/bin.cjs',
        'generate',
        '--dialect=postgresql',
        '--schema=./src/db/schema.ts',
        `--out=./${out.slice(projectFolder.length + 1)}`,
      ],
      { quiet: true },
    );
    const same = readdirSync(out).length === before && result.output.includes('No schema changes');
    if (result.code === 0 && same) {
      console.log('The migrations make exactly the tables of src/db/schema.ts');
      code = 0;
    } else {
      console.error(result.output.trim());
      console.error('\nsrc/db/schema.ts has changed since the last migration; run: npx drizzle-kit generate');
    }
  }
} finally {
  rmSync(scratch, { recursive: true, force: true });
}
process.exit(code);
