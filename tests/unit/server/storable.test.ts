import { describe, expect, it } from 'vitest';
import { unstorable } from '../../../src/server/http/storable.ts';

describe('unstorable', () => {
  it('finds nothing in what can be kept', () => {
    expect(unstorable({ a: ['é', '\u{1F441}', 1, null, true], b: { c: '' } })).toEqual([]);
  });

  it('names where a character stands that cannot be kept', () => {
    const found = unstorable({ record: { who: { theatre: 'a\u0000b' } }, answers: [{ reason: '\ud83d' }] });
    expect(found.map(({ path }) => path)).toEqual(['record.who.theatre', 'answers.0.reason']);
  });
});
