import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  draftLetter,
  type LetterKind,
  letterKinds,
  letterKindsFor,
} from '../../../src/domain/letters/letters.ts';
import { anyRecord } from '../../support/any-record.ts';

const kinds = Object.keys(letterKinds) as LetterKind[];
const wrong = /undefined|null|NaN|\[object| {2}|\.\.| [.,;:)]|,,|\(\)/;

describe.each(kinds)('letter: %s', (kind) => {
  it('makes whole sentences of any record', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        for (const { statements } of draftLetter(kind, record).sections) {
          for (const { text, reads } of statements) {
            expect(text).not.toMatch(wrong);
            expect(text).toMatch(/^[^a-z].*[.!?,]$/su);
            expect(reads.length).toBeGreaterThan(0);
          }
        }
      }),
      { numRuns: 400 },
    );
  });

  it('gives no date for flying or nitrous oxide', () => {
    const draft = draftLetter(kind, {
      version: 1,
      who: { eye: 'left' },
      tamponade: { agent: 'C3F8', concentrationPercent: 14 },
      aftercare: { flyingAdviceGiven: true, nitrousOxideAdviceGiven: true, noFlyingUntil: '2027-01-15' },
    });
    const words = draft.sections.flatMap(({ statements }) => statements.map(({ text }) => text)).join(' ');
    expect(words).toContain('confirmed that the gas has gone');
    expect(words).not.toContain('2027');
  });
});

describe('the patient’s letter', () => {
  it('explains itself without abbreviations', () => {
    const draft = draftLetter('patient', {
      version: 1,
      who: { eye: 'left', patient: { givenName: 'Maren', familyName: 'Oakhollow' } },
      before: { diagnosis: 'rhegmatogenous' },
      vitreous: { vitrectomy: true },
      tamponade: { agent: 'SF6' },
      aftercare: { drops: [{ drug: 'Dexamethasone', strength: '0.1%', timesADay: 2, weeks: 4 }] },
    });
    const words = draft.sections.flatMap(({ statements }) => statements.map(({ text }) => text)).join(' ');
    expect(words).toContain('Dear Maren Oakhollow,');
    expect(words).toContain('twice a day for 4 weeks');
    expect(words).not.toMatch(/\b(?:bd|qds|SF6|PVR|PVD|rhegmatogenous)\b/);
  });
});

describe('letterKindsFor', () => {
  it('writes to the referrer, the family doctor who is named, and the patient', () => {
    const who = { referrer: { name: 'Dr Fern' }, familyDoctor: 'Dr Moss' };
    expect(letterKindsFor({ version: 1, who })).toEqual(['referring-doctor', 'family-doctor', 'patient']);
    expect(letterKindsFor({ version: 1, who: { ...who, familyDoctor: 'Dr Fern' } })).toEqual([
      'referring-doctor',
      'patient',
    ]);
  });
});
