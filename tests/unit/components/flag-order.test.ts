import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { openFlags, placeFlags } from '../../../src/components/case/flag-order.ts';
import { stackNotes } from '../../../src/components/case/margin-layout.ts';
import { type Flag, flagKey } from '../../../src/domain/checks/flag.ts';
import type { Sheet } from '../../../src/domain/drafting/sheet.ts';

const flag = (level: Flag['level'], ...fields: string[]): Flag => ({
  rule: `rule-${fields.join('-')}`,
  level,
  fields,
  message: 'Something was found.',
  answerable: level !== 'contradiction',
});

const sheet: Sheet = {
  title: 'Operative note',
  sections: [
    {
      id: 'all',
      heading: 'All',
      statements: [
        {
          id: 'title',
          origin: 'drafted',
          text: 'T',
          drafted: 'T',
          reads: ['who.eye', 'tamponade.agent', 'buckle.elements'],
        },
        { id: 'gas', origin: 'drafted', text: 'G', drafted: 'G', reads: ['tamponade.agent'] },
        { id: 'gone', origin: 'deleted', text: '', drafted: 'X', reads: ['endOfCase.counts'] },
      ],
    },
  ],
};

describe('where flags stand', () => {
  it('is the statement that rests on their field and on little else', () => {
    expect(placeFlags([flag('caution', 'tamponade.agent')], sheet)[0]).toMatchObject({
      beside: 'gas',
      underlaid: true,
    });
  });

  it('is a statement that rests on the list around their field', () => {
    expect(placeFlags([flag('omission', 'buckle.elements.0.widthMm')], sheet)[0]).toMatchObject({
      beside: 'title',
    });
  });

  it('is near words of the same stage when no words rest on them', () => {
    expect(placeFlags([flag('omission', 'tamponade.lot')], sheet)[0]).toMatchObject({
      beside: 'gas',
      underlaid: false,
    });
  });

  it('is nowhere when the sheet says nothing of it; words taken out are no words', () => {
    expect(placeFlags([flag('omission', 'endOfCase.counts')], sheet)[0]).toMatchObject({ beside: null });
  });
});

describe('the order of flags', () => {
  it('is worst first, then the order of the operation, without those answered', () => {
    const answered = flag('omission', 'who.timeOutAt');
    const flags = [
      flag('caution', 'who.eye'),
      flag('omission', 'aftercare.posture'),
      flag('contradiction', 'tamponade.agent'),
      answered,
      flag('omission', 'before.macula'),
    ];
    const answers = [{ flag: flagKey(answered), reason: 'Not done here', by: 'A', at: '' }];
    expect(openFlags(flags, answers).map(({ fields }) => fields[0])).toEqual([
      'tamponade.agent',
      'before.macula',
      'aftercare.posture',
      'who.eye',
    ]);
  });
});

describe('notes in the margin', () => {
  it('never lie on one another and never stand above their words', () =>
    fc.assert(
      fc.property(
        fc.array(fc.record({ wanted: fc.nat(900), height: fc.integer({ min: 1, max: 200 }) })),
        (notes) => {
          const sorted = [...notes].sort((a, b) => a.wanted - b.wanted);
          const tops = stackNotes(sorted, 8);
          sorted.forEach((note, index) => {
            expect(tops[index]).toBeGreaterThanOrEqual(note.wanted);
            const next = tops[index + 1];
            if (next !== undefined) expect(next).toBeGreaterThanOrEqual((tops[index] ?? 0) + note.height + 8);
          });
        },
      ),
    ));
});
