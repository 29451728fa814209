import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import Handlebars from 'handlebars';
import { helpers } from '../src/domain/drafting/helpers.ts';

const root = fileURLToPath(new URL('..', import.meta.url));
const target = `${root}src/domain/drafting/templates.generated.js`;
const knownHelpers = Object.fromEntries(
  [...Object.keys(helpers), 'section', 'statement'].map((name) => [name, true]),
);

const folders = ['notes', 'letters', 'partials'] as const;

const sources = (folder: string) =>
  readdirSync(`${root}templates/${folder}`)
    .filter((name) => name.endsWith('.hbs'))
    .sort()
    .map((name) => ({
      name: name.replace(/\.hbs$/, ''),
      text: readFileSync(`${root}templates/${folder}/${name}`, 'utf8'),
    }));

/** The templates compiled ahead, as one module: the content security policy allows no eval. */
export const compiled = (): string => {
  const version = createHash('sha256');
  const parts = folders.map((folder) => {
    const entries = sources(folder).map(({ name, text }) => {
      version.update(`${folder}/${name}\n${text}\n`);
      const spec = Handlebars.precompile(text, { noEscape: true, knownHelpers, knownHelpersOnly: true });
      return `  ${JSON.stringify(name)}: ${String(spec)},`;
    });
    return `export const ${folder} = {\n${entries.join('\n')}\n};\n`;
  });
  const head = '// Made from templates/ by scripts/templates.ts; do not edit.\n';
  return `${head}export const TEMPLATES_VERSION = '${version.digest('hex').slice(0, 12)}';\n${parts.join('')}`;
};

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  writeFileSync(target, compiled());
  console.log(`Compiled into ${target.replace(root, '')}`);
}
