import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { draw } from '../../../src/domain/auditing/draw.ts';

const ids = Array.from({ length: 20 }, (_, at) => `note-${at}`);

describe('draw', () => {
  it('draws the same from the same seed, whatever the order', () => {
    expect(draw([...ids].reverse(), 5, 'december')).toEqual(draw(ids, 5, 'december'));
    expect(draw(ids, 5, 'january')).not.toEqual(draw(ids, 5, 'december'));
  });

  it('draws none twice and none from outside', () => {
    fc.assert(
      fc.property(fc.string(), fc.nat(30), (seed, size) => {
        const drawn = draw(ids, size, seed);
        expect(drawn).toHaveLength(Math.min(size, ids.length));
        expect(new Set(drawn).size).toBe(drawn.length);
        expect(drawn.every((id) => ids.includes(id))).toBe(true);
      }),
    );
  });

  it('draws each note about as often as any other', () => {
    const counts = new Map(ids.map((id) => [id, 0]));
    for (let seed = 0; seed < 4000; seed += 1) {
      for (const id of draw(ids, 5, `seed ${seed}`)) counts.set(id, (counts.get(id) ?? 0) + 1);
    }
    // 1000 expected, standard deviation about 27: five of them either way.
    for (const times of counts.values()) expect(Math.abs(times - 1000)).toBeLessThan(140);
  });
});
