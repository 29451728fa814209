import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { checkRecord } from '../../../src/domain/checks/engine.ts';
import { rules } from '../../../src/domain/checks/registry.ts';
import { faultsOfExamples, faultsOfForm, faultsOfMessages, recordOf } from './rule-tester.ts';

describe('registry', () => {
  it('holds every folder under its own id, each once', () => {
    const folders = readdirSync(new URL('../../../src/domain/checks/rules', import.meta.url)).sort();
    expect(rules.map(({ id }) => id)).toEqual(folders);
  });

  it('has no two rules of one title or one id', () => {
    for (const key of ['id', 'title'] as const) {
      expect(new Set(rules.map((rule) => rule[key])).size).toBe(rules.length);
    }
  });

  it('folds into rules that exist, and not in a circle', () => {
    const byId = new Map(rules.map((rule) => [rule.id, rule]));
    const visit = (id: string, seen: readonly string[]) => {
      expect(seen, id).not.toContain(id);
      expect(byId.has(id), id).toBe(true);
      for (const exact of byId.get(id)?.unless ?? []) visit(exact, [...seen, id]);
    };
    for (const { id } of rules) visit(id, []);
  });
});

describe.each(rules)('$id', (rule) => {
  it('says what it is, why it matters and where it comes from', () => {
    expect(faultsOfForm(rule)).toEqual([]);
  });

  it('has examples that fire, stay silent and cannot tell, none twice', () => {
    expect(faultsOfExamples(rule)).toEqual([]);
  });

  it.each(rule.examples.fires)('fires: $name', (example) => {
    const record = recordOf(example);
    const found = rule.check(record);
    expect(found.length).toBeGreaterThan(0);
    expect(found[0]?.fields[0]).toBe(example.fields);
    expect(faultsOfMessages(rule, record)).toEqual([]);
    // No other rule says the same of this example: it is the one that a person would see.
    expect(checkRecord(record).map((flag) => flag.rule)).toContain(rule.id);
  });

  it.each([...rule.examples.silent, ...rule.examples.unknown])('stays silent: $name', (example) => {
    expect(rule.check(recordOf(example))).toEqual([]);
  });
});
