import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { draftNote } from '../../../src/domain/drafting/draft.ts';
import { specsOnPath } from '../../../src/domain/record/field-tree.ts';
import { anyRecord } from '../../support/any-record.ts';

const wrong =
  /undefined|null|NaN|\[object| {2}|\.\.|(?<! )\( | [.,;:)]|,,|\(\)|(?:\b(?:and|with|of|by|at|to|from|the|an?|in|for)[.])$/;

describe('draftNote', () => {
  it('makes whole sentences of any record', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        const draft = draftNote(record);
        const ids = draft.sections.flatMap(({ statements }) => statements.map(({ id }) => id));
        expect(new Set(ids).size).toBe(ids.length);
        for (const { heading, statements } of draft.sections) {
          expect(heading).not.toBe('');
          expect(statements.length).toBeGreaterThan(0);
          for (const { text, reads } of statements) {
            expect(text).not.toMatch(wrong);
            expect(text).toMatch(/^[^a-z].*[.!?]$/su);
            expect(reads.length).toBeGreaterThan(0);
            for (const path of reads) expect(specsOnPath(path), path).not.toEqual([]);
          }
        }
      }),
      { numRuns: 3000 },
    );
  });

  it('says nothing of an empty record', () => {
    expect(draftNote({ version: 1 })).toEqual({ title: 'Operative note', sections: [], tables: [] });
  });

  it('knows what each statement was made from', () => {
    const draft = draftNote({
      version: 1,
      who: { eye: 'left' },
      tamponade: { agent: 'SF6', concentrationPercent: 20, pureMl: 10, syringeMl: 50 },
    });
    const [statement] = draft.sections.flatMap(({ statements }) => statements);
    expect(statement?.text).toBe('20% sulphur hexafluoride (SF6) (10 mL in 50 mL) was left in the eye.');
    expect(statement?.reads).toEqual(
      expect.arrayContaining(['tamponade.agent', 'tamponade.concentrationPercent', 'tamponade.pureMl']),
    );
    expect(statement?.reads).not.toContain('who.eye');
  });
});
