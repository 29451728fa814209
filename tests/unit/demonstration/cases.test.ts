import { describe, expect, it } from 'vitest';
import { checkCase } from '../../../src/domain/checks/check-case.ts';
import { blocking } from '../../../src/domain/checks/flag.ts';
import { draftNote } from '../../../src/domain/drafting/draft.ts';
import { mergeSheet } from '../../../src/domain/drafting/merge.ts';
import { type CaseRecord, caseRecord } from '../../../src/domain/record/schema.ts';
import { demonstrationRecords } from '../../../src/server/demonstration/cases.ts';

const records = demonstrationRecords('2026-12-01');
const inTheWay = (record: CaseRecord) =>
  blocking(checkCase(record, mergeSheet(null, draftNote(record)), {}), []);

describe("the demonstration's cases", () => {
  it('are records, of patients marked as invented', () => {
    for (const record of records) {
      expect(caseRecord.safeParse(record).success).toBe(true);
      expect(record.who?.patient?.number).toMatch(/^DEMO-\d+$/);
    }
  });

  it('end with one that can be signed as soon as its review is recorded', () => {
    const last = records.at(-1);
    if (last === undefined) throw new Error('There is no case.');
    expect(inTheWay(last).flatMap(({ fields }) => fields)).toEqual(['aftercare.reviewAt']);
    const reviewed = {
      ...last,
      aftercare: {
        ...last.aftercare,
        reviewAt: '2026-12-02T09:00',
        reviewInDays: 1,
        reviewPlace: 'retina clinic',
      },
    };
    expect(inTheWay(reviewed)).toEqual([]);
  });
});
