import { describe, expect, it, vi } from 'vitest';
import { createDeskStore, type Derivers } from '../../../src/components/case/desk-store.ts';
import { differences, valueInWords } from '../../../src/components/case/differences.ts';
import { copyOf, itemSummary } from '../../../src/components/case/list-items.ts';
import type { Flag } from '../../../src/domain/checks/flag.ts';
import { specsOnPath } from '../../../src/domain/record/field-tree.ts';
import { withoutNumbered } from '../../../src/domain/record/remove-numbered.ts';
import { type CaseRecord, emptyRecord } from '../../../src/domain/record/schema.ts';

const noEye: Flag = {
  rule: 'no-eye',
  level: 'omission',
  fields: ['who.eye'],
  message: 'The eye is not recorded.',
  answerable: true,
};

const derive: Derivers = {
  check: (record) => (record.who?.eye === undefined ? [noEye] : []),
  draft: () => ({ title: 'Note', sections: [], tables: [] }),
  merge: (sheet, draft) => sheet ?? { title: draft.title, sections: [] },
  figures: () => [],
};

const open = (record: CaseRecord = emptyRecord()) =>
  createDeskStore({ record, sheet: null, answers: [], stage: 'who' }, derive);

describe('the desk', () => {
  it('checks at every change and tells its listeners', () => {
    const store = open();
    const heard = vi.fn();
    store.subscribe(heard);
    expect(store.get().levels.get('who.eye')).toBe('omission');
    store.record('who.eye', 'left');
    expect(heard).toHaveBeenCalledTimes(1);
    expect(store.get().flags).toEqual([]);
    expect(store.get().edits).toBe(1);
  });

  it('undoes typing into one field as one step, and redoes it', () => {
    const store = open();
    store.record('before.acuity', '6');
    store.record('before.acuity', '6/9');
    store.record('who.eye', 'left');
    store.undo();
    store.undo();
    expect(store.get().record).toEqual(emptyRecord());
    store.redo();
    expect(store.get().record.before?.acuity).toBe('6/9');
  });

  it('quietens an answered flag, until the answer is taken back', () => {
    const store = open();
    store.answer(noEye, 'Not known yet');
    expect(store.get().levels.size).toBe(0);
    store.answer(noEye, '');
    expect(store.get().levels.size).toBe(1);
  });

  it('opens what hides a field', () => {
    const store = open({ ...emptyRecord(), breaks: { found: [{ clock: 2 }, { clock: 4 }] } });
    store.reveal('breaks.found.1.zone', ['breaks.found.1']);
    expect(store.get()).toMatchObject({
      stage: 'breaks',
      open: { 'breaks.found': 1 },
      expanded: { 'breaks.found.1': true },
    });
  });

  it('keeps what could not be read, until its item goes', () => {
    const store = open({ ...emptyRecord(), breaks: { found: [{ clock: 2 }] } });
    store.setBad('breaks.found.0.clock', { text: 'x', message: 'no' });
    expect(store.get().bad['breaks.found.0.clock']?.text).toBe('x');
    store.removeItem('breaks.found', 0);
    expect(store.get().bad).toEqual({});
  });
});

describe('removing an item that is called by number', () => {
  const record: CaseRecord = {
    ...emptyRecord(),
    breaks: { found: [{ clock: 1 }, { clock: 2 }, { clock: 3 }] },
    retinopexy: { treatments: [{ targets: [1, 2, 3] }, { targets: [2] }, { targets: 'all-breaks' }] },
  };

  it('moves the numbers behind it up, and drops the number that called it', () => {
    const rest = withoutNumbered(record, 'breaks.found', 1);
    expect(rest.breaks?.found).toEqual([{ clock: 1 }, { clock: 3 }]);
    expect(rest.retinopexy?.treatments).toEqual([{ targets: [1, 2] }, {}, { targets: 'all-breaks' }]);
  });

  it('leaves other lists alone', () => {
    const drops: CaseRecord = { ...emptyRecord(), aftercare: { drops: [{ drug: 'a' }, { drug: 'b' }] } };
    expect(withoutNumbered(drops, 'aftercare.drops', 0).aftercare?.drops).toEqual([{ drug: 'b' }]);
  });
});

describe('items of lists', () => {
  const fixation = specsOnPath('buckle.elements.fixation').at(-1);
  const found = specsOnPath('breaks.found').at(-1);

  it('are copied to the next quadrant that none has', () => {
    if (fixation?.kind !== 'list') throw new Error('Fixation is a list');
    const items = [{ quadrant: 'superotemporal', biteMm: 5 }];
    expect(copyOf(fixation, items, 0)).toEqual({ quadrant: 'superonasal', biteMm: 5 });
  });

  it('are called by what they are and where', () => {
    if (found?.kind !== 'list') throw new Error('Breaks are a list');
    expect(itemSummary(found, { kind: 'horseshoe', clock: 4.5 })).toBe('horseshoe tear at 4:30');
    expect(itemSummary(found, {})).toBe('');
  });
});

describe('two versions of a case', () => {
  it('are compared field by field in words', () => {
    const mine = { record: { ...emptyRecord(), before: { macula: 'on' as const } }, sheet: null };
    const theirs = {
      record: { ...emptyRecord(), before: { macula: 'off' as const, pressureMmHg: 14 } },
      sheet: null,
    };
    expect(differences(mine, theirs)).toEqual([
      { label: 'Macula', mine: 'on', theirs: 'off' },
      { label: 'Intraocular pressure', mine: 'nothing', theirs: '14 mmHg' },
    ]);
  });

  it('show values as the page does', () => {
    expect(valueInWords('breaks.found.0.clock', 4.5)).toBe('4:30 o’clock');
    expect(valueInWords('buckle.elements', 'none')).toBe('none');
    expect(valueInWords('who.performed', ['gas', 'laser'])).toBe('gas tamponade, laser retinopexy');
  });
});
