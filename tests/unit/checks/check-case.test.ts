import { describe, expect, it } from 'vitest';
import { checkCase } from '../../../src/domain/checks/check-case.ts';
import { draftNote } from '../../../src/domain/drafting/draft.ts';
import { mergeSheet } from '../../../src/domain/drafting/merge.ts';
import type { Sheet } from '../../../src/domain/drafting/sheet.ts';
import { cleanRecord } from '../../support/clinical/generate.ts';

const record = cleanRecord(2);
const clean = mergeSheet(null, draftNote(record));

const changed = (id: string, change: Partial<Sheet['sections'][number]['statements'][number]>): Sheet => ({
  ...clean,
  sections: clean.sections.map((section) => ({
    ...section,
    statements: section.statements.map((one) => (one.id === id ? { ...one, ...change } : one)),
  })),
});

describe('checkCase', () => {
  it('adds nothing to what the templates drafted', () => {
    for (let seed = 1; seed <= 300; seed += 1) {
      const one = cleanRecord(seed);
      const written = mergeSheet(null, draftNote(one));
      const asTyped = {
        ...written,
        sections: written.sections.map((section) => ({
          ...section,
          statements: section.statements.map((statement) => ({ ...statement, origin: 'edited' as const })),
        })),
      };
      const words = checkCase(one, asTyped).filter(({ rule }) => rule === 'words-against-record');
      expect(words, `${seed}`).toEqual([]);
    }
  });

  it('marks edited words that the record denies', () => {
    const other = record.who?.eye === 'left' ? 'Right' : 'Left';
    const flags = checkCase(
      record,
      changed('operation.operation', { origin: 'edited', text: `${other} vitrectomy.` }),
    );
    expect(flags).toContainEqual(
      expect.objectContaining({
        rule: 'words-against-record',
        fields: ['who.eye'],
        statement: 'operation.operation',
      }),
    );
  });

  it('misses a required statement that was taken out', () => {
    const flags = checkCase(record, changed('end.blood-loss', { origin: 'deleted', text: '' }));
    expect(flags).toContainEqual(
      expect.objectContaining({ rule: 'required-statement-taken-out', answerable: true }),
    );
  });
});
