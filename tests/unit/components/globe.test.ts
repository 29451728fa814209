import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { globeFrom } from '../../../src/components/case/globe-from-record.ts';
import {
  areaBetween,
  globeWidth,
  lineThrough,
  snapped,
  xOf,
  yOf,
} from '../../../src/components/case/globe-model.ts';
import { type CaseRecord, emptyRecord } from '../../../src/domain/record/schema.ts';

const record: CaseRecord = {
  ...emptyRecord(),
  who: { eye: 'left' },
  before: { detachmentFromClock: 11, detachmentToClock: 5 },
  breaks: {
    found: [
      { kind: 'horseshoe', clock: 2, frontEdgeMm: 11, backEdgeMm: 12 },
      { kind: 'round-hole', clock: 4.5, frontEdgeMm: 13, backEdgeMm: 16 },
      { clock: 7 },
    ],
  },
  buckle: {
    elements: [
      {
        role: 'encircling',
        widthMm: 3.5,
        frontEdgeMm: 3,
        frontEdgeReference: 'insertions',
        fixation: [{ quadrant: 'superotemporal' }, { quadrant: 'inferonasal' }],
      },
    ],
  },
};

describe('the unrolled globe', () => {
  it('has 6 at both edges and 12 in the middle', () => {
    expect(xOf(6)).toBe(0);
    expect(xOf(12)).toBe(globeWidth / 2);
    expect(xOf(3)).toBe((globeWidth * 3) / 4);
  });

  it('finds the place under a point on half hours and half millimetres', () =>
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 25 }), fc.integer({ min: 0, max: 40 }), (halfHours, halfMm) => {
        const place = { clock: halfHours / 2, mm: halfMm / 2 };
        expect(snapped(xOf(place.clock), yOf(place.mm))).toEqual(place);
      }),
    ));

  it('breaks a line where it goes round 6, and joins it at both edges', () => {
    const points = [5.5, 6, 6.5].map((clock) => ({ clock, mm: 1 }));
    const line = lineThrough(points);
    expect(line.match(/M/g)).toHaveLength(2);
    expect(line).toContain(`L${globeWidth}.0 8.0M0.0 8.0`);
    expect(areaBetween({ front: points, back: points }).match(/Z/g)).toHaveLength(2);
  });

  it('waits for the eye', () => expect(globeFrom(emptyRecord())).toBeNull());

  it('puts the lateral rectus on the temporal side of each eye', () => {
    const clockOf = (eye: 'left' | 'right') =>
      globeFrom({ ...emptyRecord(), who: { eye } })?.muscles.find(({ name }) => name === 'lateral rectus')
        ?.clock;
    expect(clockOf('left')).toBe(3);
    expect(clockOf('right')).toBe(9);
  });

  it('shows what is held, what is not and by how much, and what cannot be told', () => {
    const breaks = globeFrom(record)?.breaks ?? [];
    expect(breaks.map(({ number, sure }) => [number, sure])).toEqual([
      [1, true],
      [2, true],
      [3, false],
    ]);
    expect(breaks[0]?.shortfall).toBeNull();
    expect(breaks[1]?.shortfall).toMatch(/^\d\.\d mm not on the element$/);
    expect(breaks[2]?.shortfall).toBeNull();
  });

  it('draws the element round the whole eye with a fixation in the middle of its quadrant', () => {
    const [element] = globeFrom(record)?.elements ?? [];
    expect(element?.front[0]?.clock).toBe(6);
    expect(element?.front.at(-1)?.clock).toBe(6);
    expect(element?.fixations.map(({ clock }) => clock)).toEqual([1.5, 7.5]);
  });

  it('says in words what it shows', () => {
    const summary = globeFrom(record)?.summary ?? '';
    expect(summary).toContain('left eye');
    expect(summary).toContain('detached from 11 to 5 o’clock');
    expect(summary).toContain('1 element;');
    expect(summary).toContain('Break 3, kind not recorded at 7 o’clock, depth not recorded');
  });
});
