import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { compiled } from '../../../scripts/templates.ts';

it('keeps the compiled templates in step with their sources', () => {
  const file = new URL('../../../src/domain/drafting/templates.generated.js', import.meta.url);
  expect(readFileSync(file, 'utf8') === compiled(), 'Run: npx tsx scripts/templates.ts').toBe(true);
});
