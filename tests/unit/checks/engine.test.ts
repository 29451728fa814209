import { readdirSync, readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkRecord } from '../../../src/domain/checks/engine.ts';
import { flagKey, levels } from '../../../src/domain/checks/flag.ts';
import { rules } from '../../../src/domain/checks/registry.ts';
import { specsOnPath } from '../../../src/domain/record/field-tree.ts';
import { withValue } from '../../../src/domain/record/paths.ts';
import { type CaseRecord, emptyRecord, stages } from '../../../src/domain/record/schema.ts';
import { anyRecord } from '../../support/any-record.ts';
import { recordOf } from './rule-tester.ts';

const fixtures = new URL('../../fixtures/', import.meta.url);
const sound = readdirSync(fixtures).map((name) =>
  recordOf({ record: JSON.parse(readFileSync(new URL(name, fixtures), 'utf8')) }),
);

/** What states an exception: without it the general case holds again, and may be contradicted. */
const exceptions = /frontEdgeByQuadrantMm|imbricatedOver/;

const leavesOf = (value: unknown, path: string): string[] => {
  if (Array.isArray(value) && value.every((one) => typeof one !== 'object')) return [path];
  if (typeof value !== 'object' || value === null) return [path];
  return Object.entries(value).flatMap(([key, inner]) =>
    leavesOf(inner, path === '' ? key : `${path}.${key}`),
  );
};

const factsOf = (record: CaseRecord) =>
  leavesOf(record, '').filter((path) => path !== 'version' && !exceptions.test(path));

const contradicting = rules.filter(({ level }) => level === 'contradiction');

/** Every rule of contradictions that finds something, folded or not. */
const contradictionsIn = (record: CaseRecord): string[] =>
  contradicting.filter((rule) => rule.check(record).length > 0).map(({ id }) => id);

const newWithout = (record: CaseRecord, leaf: string, before: readonly string[]): string[] =>
  contradictionsIn(withValue(record, leaf, undefined)).filter((id) => !before.includes(id));

describe('checkRecord', () => {
  it('reads any record without failing, and names fields that exist', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        for (const { fields, message } of checkRecord(record)) {
          expect(message).not.toMatch(/undefined|null|NaN|\[object/);
          for (const field of fields) expect(specsOnPath(field), field).not.toEqual([]);
        }
      }),
      { numRuns: 400 },
    );
  });

  it('gives the same flags again, and leaves the record as it was', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        const before = JSON.stringify(record);
        expect(checkRecord(record)).toEqual(checkRecord(record));
        expect(JSON.stringify(record)).toBe(before);
      }),
      { numRuns: 100 },
    );
  });

  it('puts the worst first, then the order of the operation', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        const ranks = checkRecord(record).map(
          ({ level, fields }) =>
            levels.indexOf(level) * 100 + stages.findIndex((stage) => fields[0]?.startsWith(`${stage}.`)),
        );
        expect(ranks).toEqual([...ranks].sort((a, b) => a - b));
      }),
      { numRuns: 100 },
    );
  });

  it('says nothing twice', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        const keys = checkRecord(record).map(flagKey);
        expect(new Set(keys).size).toBe(keys.length);
      }),
      { numRuns: 100 },
    );
  });

  it('is silent on the fixtures but for cautions', () => {
    for (const record of sound) {
      expect(checkRecord(record).filter(({ level }) => level !== 'caution')).toEqual([]);
    }
  });

  it('says of an empty record what each stage lacks, in one flag a stage', () => {
    const flags = checkRecord(emptyRecord());
    expect(flags.every(({ level }) => level === 'omission')).toBe(true);
    expect(flags.length).toBeLessThanOrEqual(stages.length);
  });
});

describe('what is missing', () => {
  it('contradicts nothing in any record', () => {
    fc.assert(
      fc.property(anyRecord, fc.nat(), (record, at) => {
        const leaves = factsOf(record);
        const leaf = leaves[at % Math.max(1, leaves.length)];
        if (leaf === undefined) return;
        expect(newWithout(record, leaf, contradictionsIn(record))).toEqual([]);
      }),
      { numRuns: 1500 },
    );
  });

  it('contradicts nothing in the fixtures, whichever field is taken out', () => {
    for (const record of sound) {
      for (const leaf of factsOf(record)) expect(newWithout(record, leaf, []), leaf).toEqual([]);
    }
  });

  it.each(rules)('contradicts nothing in the examples of $id', ({ examples }) => {
    for (const example of [...examples.fires, ...examples.silent, ...examples.unknown]) {
      const record = recordOf(example);
      const before = contradictionsIn(record);
      for (const leaf of factsOf(record)) expect(newWithout(record, leaf, before), leaf).toEqual([]);
    }
  });
});

describe('settings of a unit', () => {
  const caution = rules.find(({ level }) => level === 'caution');
  const contradiction = rules.find(({ level }) => level === 'contradiction');
  const flagOf = (rule: typeof caution, settings: Record<string, 'omission' | 'off'>) => {
    const example = rule?.examples.fires[0];
    if (rule === undefined || example === undefined) throw new Error('there is no such rule');
    return checkRecord(recordOf(example), settings).find((flag) => flag.rule === rule.id);
  };

  it('raise a caution to an omission, or switch it off', () => {
    const id = caution?.id ?? '';
    expect(flagOf(caution, {})?.level).toBe('caution');
    expect(flagOf(caution, { [id]: 'omission' })).toMatchObject({ level: 'omission', answerable: true });
    expect(flagOf(caution, { [id]: 'off' })).toBeUndefined();
  });

  it('do nothing to a contradiction', () => {
    const id = contradiction?.id ?? '';
    expect(flagOf(contradiction, { [id]: 'off' })?.level).toBe('contradiction');
    expect(flagOf(contradiction, { [id]: 'omission' })?.level).toBe('contradiction');
  });
});

describe('folding', () => {
  it('keeps the flag of an item when the more exact one is about another', () => {
    const off = { kind: 'dialysis', zone: 'equator' } as const;
    const flags = checkRecord(
      recordOf({
        record: {
          before: { axialLengthMm: 24 },
          breaks: { found: [{ ...off, frontEdgeMm: 6, backEdgeMm: 7 }, off] },
        },
      }),
    ).filter(({ rule }) => rule === 'dialysis-off-the-ora' || rule === 'break-off-its-zone');
    expect(flags.map(({ rule, fields }) => [rule, fields[0]])).toEqual([
      ['break-off-its-zone', 'breaks.found.0.zone'],
      ['dialysis-off-the-ora', 'breaks.found.1.zone'],
    ]);
  });
});
