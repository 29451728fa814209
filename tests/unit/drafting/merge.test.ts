import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { draftNote } from '../../../src/domain/drafting/draft.ts';
import { mergeSheet } from '../../../src/domain/drafting/merge.ts';
import type { Sheet, Statement } from '../../../src/domain/drafting/sheet.ts';
import { anyRecord } from '../../support/any-record.ts';

type Edit =
  | { kind: 'write'; at: number; text: string }
  | { kind: 'delete'; at: number }
  | { kind: 'add'; at: number; text: string };

const edit: fc.Arbitrary<Edit> = fc.oneof(
  fc.record({ kind: fc.constant('write' as const), at: fc.nat(30), text: fc.constantFrom('Mine.', 'Ours.') }),
  fc.record({ kind: fc.constant('delete' as const), at: fc.nat(30) }),
  fc.record({ kind: fc.constant('add' as const), at: fc.nat(30), text: fc.constantFrom('Added.', 'Also.') }),
);

const all = (sheet: Sheet) => sheet.sections.flatMap(({ statements }) => statements);

/** What a person does to a sheet, by the rules that the editor keeps. */
const apply = (sheet: Sheet, { at, ...what }: Edit, serial: number): Sheet => {
  const target = all(sheet)[at % Math.max(1, all(sheet).length)];
  if (target === undefined) return sheet;
  const change = (statement: Statement): Statement[] => {
    if (statement !== target) return [statement];
    if (what.kind === 'delete') {
      return statement.origin === 'own' ? [] : [{ ...statement, origin: 'deleted', text: '' }];
    }
    if (what.kind === 'add') {
      const own: Statement = { id: `own-${serial}`, origin: 'own', text: what.text, drafted: '', reads: [] };
      return [statement, own];
    }
    if (statement.origin === 'deleted') return [statement];
    return [{ ...statement, text: what.text, origin: statement.origin === 'own' ? 'own' : 'edited' }];
  };
  const sections = sheet.sections.map((section) => ({
    ...section,
    statements: section.statements.flatMap(change),
  }));
  return { ...sheet, sections };
};

const typedTexts = (sheet: Sheet) =>
  all(sheet)
    .filter(({ origin }) => origin === 'own' || origin === 'edited' || origin === 'parted')
    .map(({ id, text }) => `${id} ${text}`);

describe('mergeSheet', () => {
  it('redraws, keeps and parts through any sequence of changes and edits', () => {
    fc.assert(
      fc.property(
        anyRecord,
        fc.array(fc.tuple(fc.array(edit, { maxLength: 3 }), anyRecord), { maxLength: 3 }),
        (first, steps) => {
          let sheet = mergeSheet(null, draftNote(first));
          let serial = 0;
          for (const [edits, next] of steps) {
            for (const one of edits) {
              serial += 1;
              sheet = apply(sheet, one, serial);
            }
            const draft = draftNote(next);
            const typed = typedTexts(sheet);
            sheet = mergeSheet(sheet, draft);
            expect(mergeSheet(sheet, draft)).toEqual(sheet);
            const now = new Map(
              draft.sections.flatMap(({ statements }) => statements.map(({ id, text }) => [id, text])),
            );
            for (const { id, origin, text } of all(sheet)) {
              if (origin === 'drafted') expect(text).toBe(now.get(id));
            }
            const kept = new Set(all(sheet).map(({ id, text }) => `${id} ${text}`));
            for (const words of typed) expect(kept).toContain(words);
          }
        },
      ),
      { numRuns: 150 },
    );
  });

  const draft = (text: string) => ({
    title: 'Note',
    tables: [],
    sections: [{ id: 's', heading: 'S', statements: [{ id: 's.a', text, reads: ['who.eye'] }] }],
  });
  const edited: Sheet = {
    title: 'Note',
    sections: [
      {
        id: 's',
        heading: 'S',
        statements: [
          { id: 's.a', origin: 'edited', text: 'Mine.', drafted: 'Left eye.', reads: ['who.eye'] },
        ],
      },
    ],
  };
  const only = (sheet: Sheet) => all(sheet)[0];

  it('parts an edited statement when its facts change, with both wordings', () => {
    expect(only(mergeSheet(edited, draft('Right eye.')))).toMatchObject({
      origin: 'parted',
      text: 'Mine.',
      drafted: 'Right eye.',
    });
  });

  it('takes an edit that says what is drafted for drafted again', () => {
    expect(only(mergeSheet(edited, draft('Mine.')))).toMatchObject({ origin: 'drafted', text: 'Mine.' });
  });

  it('keeps what was deleted deleted', () => {
    const [section] = edited.sections;
    const gone = {
      ...edited,
      sections: [
        {
          id: 's',
          heading: 'S',
          statements: [{ ...(section?.statements[0] as Statement), origin: 'deleted' as const, text: '' }],
        },
      ],
    };
    expect(only(mergeSheet(gone, draft('Right eye.')))).toMatchObject({
      origin: 'deleted',
      text: '',
      drafted: 'Right eye.',
    });
  });
});
