import { readdirSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Example } from '../../../src/domain/checks/define-rule.ts';
import { families } from '../../../src/domain/checks/define-rule.ts';
import { checkRecord } from '../../../src/domain/checks/engine.ts';
import { rules } from '../../../src/domain/checks/registry.ts';
import { specsOnPath } from '../../../src/domain/record/field-tree.ts';
import { withValue } from '../../../src/domain/record/paths.ts';
import { readRecord } from '../../../src/domain/record/read.ts';
import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { anyRecord } from '../../support/any-record.ts';

const recordOf = ({ record }: Example): CaseRecord => {
  const read = readRecord({ version: 1, ...record });
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  return read.value;
};

describe('registry', () => {
  it('holds every folder under its own id, each once', () => {
    const folders = readdirSync(new URL('../../../src/domain/checks/rules', import.meta.url)).sort();
    expect(rules.map(({ id }) => id)).toEqual(folders);
  });
});

describe.each(rules)('$id', (rule) => {
  it('says what it is, why it matters and where it comes from', () => {
    expect(rule.id).toMatch(/^[a-z0-9]+(?:-[a-z0-9]+)+$/);
    expect(families).toContain(rule.family);
    for (const text of [rule.title, rule.why, rule.source.text]) expect(text.length).toBeGreaterThan(3);
    expect(rule.why).toMatch(/[.]$/);
    if (rule.level === 'contradiction') expect(rule.answerable).toBe(false);
    for (const id of rule.unless ?? []) expect(rules.map((other) => other.id)).toContain(id);
  });

  it('has examples that fire, stay silent and cannot tell, none twice', () => {
    const { fires, silent, unknown } = rule.examples;
    expect(fires.length).toBeGreaterThan(0);
    expect(silent.length).toBeGreaterThan(0);
    // What a standard requires is never unknown: it is there or missing.
    if (!rule.id.startsWith('required-')) expect(unknown.length).toBeGreaterThan(0);
    const all = [...fires, ...silent, ...unknown].map(({ record }) => JSON.stringify(record));
    expect(new Set(all).size).toBe(all.length);
  });

  it.each(rule.examples.fires)('fires: $name', (example) => {
    const found = rule.check(recordOf(example));
    expect(found.length).toBeGreaterThan(0);
    expect(found[0]?.fields[0]).toBe(example.fields);
    for (const { fields, message } of found) {
      expect(message).toMatch(/^[^a-z].*[.]$/su);
      expect(message).not.toMatch(/undefined|null|NaN|\[object| {2}|\.\./);
      for (const field of fields) expect(specsOnPath(field), field).not.toEqual([]);
    }
  });

  it.each([...rule.examples.silent, ...rule.examples.unknown])('stays silent: $name', (example) => {
    expect(rule.check(recordOf(example))).toEqual([]);
  });
});

/** What states an exception: without it the general case holds again, and may be contradicted. */
const exceptions = /frontEdgeByQuadrantMm|imbricatedOver/;

const leavesOf = (value: unknown, path: string): string[] => {
  if (Array.isArray(value) && value.every((one) => typeof one !== 'object')) return [path];
  if (typeof value !== 'object' || value === null) return [path];
  return Object.entries(value).flatMap(([key, inner]) =>
    leavesOf(inner, path === '' ? key : `${path}.${key}`),
  );
};

describe('checkRecord', () => {
  it('reads any record without failing, and names fields that exist', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        for (const { fields, message } of checkRecord(record)) {
          expect(message).not.toMatch(/undefined|null|NaN|\[object/);
          for (const field of fields) expect(specsOnPath(field), field).not.toEqual([]);
        }
      }),
      { numRuns: 600 },
    );
  });

  it('never finds a contradiction in what is missing', () => {
    fc.assert(
      fc.property(anyRecord, fc.nat(), (record, at) => {
        const leaves = leavesOf(record, '').filter((path) => path !== 'version' && !exceptions.test(path));
        const leaf = leaves[at % Math.max(1, leaves.length)];
        if (leaf === undefined) return;
        const contradictions = (of: CaseRecord) =>
          checkRecord(of).flatMap((flag) => (flag.level === 'contradiction' ? [flag.rule] : []));
        const before = contradictions(record);
        for (const rule of contradictions(withValue(record, leaf, undefined))) expect(before).toContain(rule);
      }),
      { numRuns: 600 },
    );
  });
});
