import { describe, expect, it } from 'vitest';
import { families } from '../../../src/domain/checks/define-rule.ts';
import { readRecord } from '../../../src/domain/record/read.ts';
import { faults } from '../../support/clinical/faults.ts';
import { cleanRecord } from '../../support/clinical/generate.ts';
import { randomFrom } from '../../support/clinical/random.ts';

const records = Array.from({ length: 1500 }, (_, start) => cleanRecord(start));

describe('faults put into sound records', () => {
  it('are many, each named once, in every family', () => {
    expect(faults.length).toBeGreaterThanOrEqual(150);
    expect(new Set(faults.map((fault) => fault.id)).size).toBe(faults.length);
    expect(new Set(faults.map((fault) => fault.family))).toEqual(new Set(families));
  });

  it.each(faults.map((fault) => [fault.id, fault] as const))('%s', (_, fault) => {
    let applied = 0;
    for (const [start, record] of records.entries()) {
      const before = JSON.stringify(record);
      const faulty = fault.apply(record, randomFrom(start));
      if (faulty === null) continue;
      applied += 1;
      expect(JSON.stringify(record)).toBe(before);
      expect(faulty, `record ${start}`).not.toEqual(record);
      const read = readRecord(faulty);
      expect(read.ok ? [] : read.error, `record ${start}`).toEqual([]);
      if (applied >= 60) break;
    }
    expect(applied).toBeGreaterThan(0);
  });
});
