import { spawnSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../../..', import.meta.url));
const fixtures = join(root, 'tests/fixtures');

const run = (args: string[], input = '') => {
  const { status, stdout, stderr } = spawnSync('node', ['--import', 'tsx', 'scripts/buckram.ts', ...args], {
    cwd: root,
    input,
    encoding: 'utf8',
  });
  return { status, stderr, json: (): unknown => JSON.parse(stdout) };
};

describe('buckram', () => {
  it.each(readdirSync(fixtures))('finds neither contradiction nor omission in %s', (name) => {
    const { status, json } = run(['check', join(fixtures, name), '--fail-on', 'omission']);
    expect(json()).toEqual(expect.any(Array));
    expect(status).toBe(0);
  });

  it('reads standard input and gives each flag its rule, level, fields and message', () => {
    const { status, json } = run(['check', '-'], '{"who":{"eye":"left","consentEye":"right"}}');
    expect(status).toBe(0);
    expect(json()).toContainEqual({
      rule: 'side-differs',
      level: 'contradiction',
      fields: ['who.consentEye', 'who.eye'],
      message: 'The left eye is recorded as operated on; the consent says right.',
      answerable: false,
    });
  });

  it('checks many records, one a line, and fails a script that asks for it', () => {
    const lines = '{"who":{"eye":"left","consentEye":"right"}}\n{"version":1}\n';
    const { status, json } = run(['check', '-', '--fail-on', 'contradiction'], lines);
    expect(status).toBe(1);
    expect(json()).toMatchObject({ summary: { records: 2, contradiction: 1 } });
  });

  it('drafts a note and a letter, and the same document twice', () => {
    const folder = mkdtempSync(join(tmpdir(), 'buckram-cli-'));
    const file = join(fixtures, 'vitrectomy-with-gas.json');
    const [first, second] = [join(folder, 'a.docx'), join(folder, 'b.docx')];
    expect(run(['draft', file, '--docx', first]).json()).toMatchObject({ title: 'Operative note' });
    run(['draft', file, '--docx', second]);
    expect(readFileSync(first).equals(readFileSync(second))).toBe(true);
    expect(run(['draft', file, '--letter', 'patient']).json()).toMatchObject({
      title: 'Letter to the patient',
    });
  });

  it('answers schema, rules, codes, numbers and formulas', () => {
    const file = join(fixtures, 'vitrectomy-with-gas.json');
    expect(run(['schema']).json()).toMatchObject({ type: 'object' });
    expect(run(['rules']).json()).toContainEqual(
      expect.objectContaining({ id: 'side-differs', why: expect.any(String) }),
    );
    expect(run(['codes', file]).json()).toMatchObject({ notice: expect.stringContaining('Confirm') });
    expect(run(['numbers', file]).json()).toContainEqual(
      expect.objectContaining({ id: 'gas-span', unit: 'days' }),
    );
    expect(run(['compute', 'shortening-height', 'shorteningMm=6.28']).json()).toMatchObject({ unit: 'mm' });
  });

  it('marks the words that a record denies', () => {
    const folder = mkdtempSync(join(tmpdir(), 'buckram-cli-'));
    const record = join(folder, 'record.json');
    writeFileSync(record, '{"who":{"eye":"left"}}');
    expect(run(['read', record, '-'], 'Right vitrectomy.').json()).toMatchObject([
      { kind: 'side', field: 'who.eye' },
    ]);
  });

  it('tells a whole proof from a changed one', () => {
    const canonical = '{"a":1}';
    const whole = {
      canonical,
      sha256: '015abd7f5cc57a2dd94b7590f04ad8084273905ee33ec5cebeae62276a97f862',
      verificationCode: '',
    };
    const { json } = run(['verify', '-'], JSON.stringify(whole));
    expect(json()).toMatchObject({ canonicalForm: true, sha256: true, verificationCode: false });
    expect(run(['verify', '-'], JSON.stringify({ ...whole, canonical: '{"a":2}' })).json()).toMatchObject({
      sha256: false,
    });
  });

  it.each([
    [['check', '/nowhere.json'], 'cannot read /nowhere.json'],
    [['check', '-'], '- is not JSON'],
    [['compute', 'nothing'], 'There is no formula nothing'],
    [['compute', 'shortening-height', 'shorteningMm=x'], 'shorteningMm must be a number'],
    [['nothing'], 'there is no command nothing'],
  ])('answers bad input with one line and 2: %j', (args, message) => {
    const { status, stderr } = run(args);
    expect(status).toBe(2);
    expect(stderr).toContain(message);
    expect(stderr.trim().split('\n')).toHaveLength(1);
  });

  it('says in one line where a record does not fit', () => {
    const { status, stderr } = run(['check', '-'], '{"buckle":{"elements":[{"widthMm":"wide"}]},"foo":1}');
    expect(status).toBe(2);
    expect(stderr).toContain('buckle.elements.0.widthMm');
    expect(stderr.trim().split('\n')).toHaveLength(1);
  });
});
