import { describe, expect, it } from 'vitest';
import { importsOf, violationOf } from '../../../scripts/check-imports.mjs';
import { countOf } from '../../../scripts/lib/count.mjs';

describe('the direction of imports', () => {
  it.each([
    ['src/domain/checks/engine.ts', './flag.ts'],
    ['src/domain/record/schema.ts', 'zod'],
    ['src/domain/drafting/draft.ts', 'handlebars/runtime.js'],
    ['src/components/case/Sheet.tsx', '@tiptap/react'],
    ['src/components/case/Sheet.tsx', '../../domain/api.ts'],
    ['src/pages/api/cases/[id].ts', '../../../server/http/answers.ts'],
    ['src/server/cases/save.ts', '../../db/cases.ts'],
    ['src/server/cases/save.ts', 'node:crypto'],
    ['src/db/client.ts', 'drizzle-orm/node-postgres'],
    ['src/layouts/Page.astro', '../styles/global.css'],
  ])('%s may import %s', (path, specifier) => {
    expect(violationOf(path, specifier)).toBeUndefined();
  });

  it.each([
    ['src/domain/checks/engine.ts', '../../server/http/answers.ts'],
    ['src/domain/checks/engine.ts', 'node:crypto'],
    ['src/domain/checks/engine.ts', 'react'],
    ['src/domain/checks/engine.ts', 'zod-elsewhere'],
    ['src/components/case/Sheet.tsx', '../../server/cases/save.ts'],
    ['src/components/case/Sheet.tsx', '../../db/cases.ts'],
    ['src/components/case/Sheet.tsx', 'drizzle-orm'],
    ['src/components/case/Sheet.tsx', 'node:fs'],
    ['src/server/cases/save.ts', '../../pages/index.astro'],
    ['src/server/cases/save.ts', '../../components/ui/Key.tsx'],
    ['src/pages/index.astro', '../db/cases.ts'],
    ['src/pages/index.astro', 'drizzle-orm'],
    ['src/db/client.ts', '../server/config.ts'],
    ['src/db/client.ts', 'react'],
    ['src/pages/index.astro', '../../tests/support/server.ts'],
    ['src/elsewhere/x.ts', 'zod'],
  ])('%s may not import %s', (path, specifier) => {
    expect(violationOf(path, specifier)).toBeTypeOf('string');
  });

  it('sees imports, re-exports, later loads and both parts of an Astro file', () => {
    const script =
      "import a from 'a';\nexport * from 'b';\nconst c = import('c');\nimport type { D } from 'd';";
    expect(importsOf('src/x.ts', script)).toEqual(['a', 'b', 'c', 'd']);
    const page = "---\nimport a from 'a';\n---\n<p>from 'x'</p>\n<script>import b from 'b';</script>\n";
    expect(importsOf('src/x.astro', page)).toEqual(['a', 'b']);
  });
});

describe('counting a run of tests', () => {
  const report = (changes: object) => () =>
    JSON.stringify({
      numPassedTests: 3,
      numFailedTests: 0,
      numPendingTests: 0,
      numTodoTests: 0,
      testResults: [{ status: 'passed', assertionResults: [{ status: 'passed' }] }],
      ...changes,
    });

  it('counts what passed and what failed', () => {
    expect(countOf(0, report({}))).toEqual({ passed: 3, failed: 0 });
    expect(countOf(1, report({ numFailedTests: 2 }))).toEqual({ passed: 3, failed: 2 });
  });

  it('counts a file that could not be loaded, a test left out and an error outside tests as failed', () => {
    const broken = { testResults: [{ status: 'failed', assertionResults: [] }] };
    expect(countOf(1, report(broken))).toEqual({ passed: 3, failed: 1 });
    expect(countOf(0, report({ numPendingTests: 1 }))).toEqual({ passed: 3, failed: 1 });
    expect(countOf(1, report({}))).toEqual({ passed: 3, failed: 1 });
  });

  it('counts a run without a report as failed, unless there was nothing to run', () => {
    const none = () => {
      throw new Error('no report');
    };
    expect(countOf(1, none)).toEqual({ passed: 0, failed: 1 });
    expect(countOf(0, none)).toEqual({ passed: 0, failed: 0 });
  });
});
