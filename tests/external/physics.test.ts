import { describe, expect, it } from 'vitest';
import { compute } from '../../src/domain/physics/formulas.ts';

const value = (name: string, inputs: Record<string, string | number>): number => {
  const answer = compute(name, inputs);
  if (!answer.ok) throw new Error(answer.error.message);
  const { result } = answer.value;
  if (!('value' in result) || typeof result.value !== 'number') throw new Error('a range');
  return result.value;
};

const range = (name: string, inputs: Record<string, string | number>): [number, number] => {
  const answer = compute(name, inputs);
  if (!answer.ok) throw new Error(answer.error.message);
  const { result } = answer.value;
  return 'low' in result ? [result.low, result.high] : [Number(result.value), Number(result.value)];
};

describe('globe: 24 mm sphere (computed; texts 71 to 75 mm and 9 to 12 mm)', () => {
  it('has 75.40 mm of circumference and its equator 12.7 mm behind the limbus', () => {
    expect(value('globe-circumference', {})).toBeCloseTo(75.4, 2);
    expect(value('equator-arc', {})).toBeCloseTo(12.7, 1);
    expect(value('parallel-circumference', { arcMm: value('equator-arc', {}) })).toBeCloseTo(75.4, 2);
  });
});

describe('insertions: spiral of Tillaux, IOVS 2022;63:1877 (read)', () => {
  it.each([
    ['right', 3, 5.5],
    ['left', 9, 5.5],
    ['right', 6, 6.5],
    ['right', 9, 6.9],
    ['left', 3, 6.9],
    ['left', 12, 7.7],
  ])('%s eye at %i: %f mm', (eye, clock, expected) => {
    expect(value('insertion-distance', { eye, clock })).toBeCloseTo(expected, 6);
  });
});

describe('ora: nasal 5 to 7.5, temporal 7 to 8.5 mm (read, two texts)', () => {
  it('keeps the range of each side', () => {
    expect(range('ora-range', { eye: 'right', clock: 3 })).toEqual([5, 7.5]);
    expect(range('ora-range', { eye: 'right', clock: 9 })).toEqual([7, 8.5]);
  });
});

describe('clock faces (common practice)', () => {
  it('has temporal at 9 in a right eye and at 3 in a left', () => {
    const quadrant = (eye: string, clock: number) => {
      const answer = compute('clock-quadrant', { eye, clock });
      return answer.ok && 'value' in answer.value.result ? answer.value.result.value : '';
    };
    expect(quadrant('right', 10)).toBe('superotemporal');
    expect(quadrant('left', 2)).toBe('superotemporal');
    expect(quadrant('right', 4)).toBe('inferonasal');
    expect(quadrant('left', 4)).toBe('inferotemporal');
  });
});

describe('shortening to height: IOVS abstract 2357577 (read) and h = ΔL/2π (computed)', () => {
  it.each([
    [6.28, 1.0],
    [3.14, 0.5],
    [5, 0.8],
    [10, 1.59],
    [12.57, 2.0],
  ])('%f mm gives %f mm', (shorteningMm, height) => {
    expect(value('shortening-height', { shorteningMm })).toBeCloseTo(height, 2);
  });
});

describe('sutures (read)', () => {
  it('has the published strengths', () => {
    expect(value('suture-strength', { material: 'polyglactin-910', day: 28 })).toBe(25);
    expect(value('suture-strength', { material: 'polyglactin-910', day: 35 })).toBe(0);
    expect(value('suture-strength', { material: 'polydioxanone', day: 28 })).toBe(50);
    expect(value('suture-strength', { material: 'polydioxanone', day: 42 })).toBe(25);
    expect(value('suture-strength', { material: 'nylon', day: 1000 })).toBe(100);
  });
});

describe('gas: safety alert of 18 December 2018 (read)', () => {
  it.each([
    ['SF6', 2, 1, 2],
    ['C2F6', 3, 1, 3],
    ['C3F8', 4, 3, 4],
  ])('%s pure grows %i times, largest on day %i to %i', (gas, times, from, to) => {
    expect(value('gas-expansion', { gas, percent: 100 })).toBeCloseTo(times, 6);
    expect(range('gas-largest-day', { gas })).toEqual([from, to]);
  });

  it('does not grow at the isoexpansile concentrations', () => {
    for (const [gas, percent] of [
      ['SF6', 20],
      ['C2F6', 16],
      ['C3F8', 14],
    ] as const) {
      expect(value('gas-expansion', { gas, percent })).toBe(1);
    }
  });
});

describe('half-lives: Thompson 1989;107:687 and 1992;110:1594 (read)', () => {
  it.each([
    ['air', 100, 'phakic', 1.6, 1.6],
    ['air', 100, 'aphakic', 0.9, 0.9],
    ['SF6', 20, 'phakic', 2.8, 2.8],
    ['SF6', 20, 'aphakic', 2.4, 2.4],
    ['C3F8', 10, 'phakic', 5.7, 6.5],
    ['C3F8', 5, 'phakic', 4.2, 4.2],
    ['C3F8', 15, 'phakic', 8, 8],
    ['C3F8', 20, 'phakic', 12.5, 12.5],
  ])('%s %i%% %s: %f to %f days', (gas, percent, lens, low, high) => {
    expect(range('gas-half-life', { gas, percent, lens })).toEqual([low, high]);
  });

  it('leaves a tenth after the days computed from them', () => {
    expect(value('gas-days-to-fraction', { gas: 'SF6', percent: 20 })).toBeCloseTo(9.3, 1);
    expect(range('gas-days-to-fraction', { gas: 'C3F8', percent: 10 })[0]).toBeCloseTo(18.9, 1);
  });
});

describe('dilution (computed)', () => {
  it.each([
    [50, 20, 10],
    [50, 16, 8],
    [50, 14, 7],
    [50, 12, 6],
    [60, 20, 12],
    [60, 16, 9.6],
    [60, 14, 8.4],
    [60, 12, 7.2],
  ])('%i mL at %i%%: %f mL', (syringeMl, percent, pureMl) => {
    expect(value('gas-dilution-pure-ml', { syringeMl, percent })).toBeCloseTo(pureMl, 6);
    expect(value('gas-dilution-percent', { syringeMl, pureMl })).toBeCloseTo(percent, 6);
  });
});

describe('altitude (computed, Boyle)', () => {
  it('makes 1.35 mL of 1.00 mL in a cabin at about 8,000 ft', () => {
    expect(value('altitude-volume', { volumeMl: 1 })).toBeCloseTo(1.35, 2);
    expect(value('altitude-pressure', { metres: 2438.4 })).toBeCloseTo(564, -0.5);
  });
});

describe('a bubble in a sphere (computed; 0.28 mL for 90° matches Parver and Lincoff)', () => {
  it.each([
    [90, 10.5, 0.282],
    [120, 10.5, 0.758],
    [180, 10.5, 2.425],
    [90, 12, 0.42],
    [120, 12, 1.131],
    [180, 12, 3.619],
  ])('%i° at R %f mm: %f mL', (arcDegrees, radiusMm, volumeMl) => {
    expect(value('bubble-volume', { arcDegrees, radiusMm })).toBeCloseTo(volumeMl, 3);
    expect(value('bubble-angle', { volumeMl, radiusMm })).toBeCloseTo(arcDegrees, 0);
  });
});

describe('posture puts the break uppermost (computed)', () => {
  it.each([
    [9, 13, 'left-side'],
    [3, 13, 'right-side'],
    [12, 13, 'upright'],
    [6, 31, 'face-down'],
  ])('a break at %i o’clock, %i mm: %s', (clock, mmBehindLimbus, position) => {
    const cover = (of: string) =>
      value('bubble-cover', { clock, mmBehindLimbus, fillPercent: 40, position: of });
    const others = ['upright', 'face-down', 'right-side', 'left-side', 'supine'].filter(
      (one) => one !== position,
    );
    for (const other of others) expect(cover(position)).toBeGreaterThan(cover(other));
  });
});

describe('axial length to dioptres (computed: thin lens, K 43.5 D, emmetropic pseudophake)', () => {
  it.each([
    [0.5, 24, -1.29],
    [0.99, 24, -2.54],
    [1, 24, -2.57],
    [1, 23, -2.87],
    [1, 25, -2.31],
  ])('+%f mm at %i mm: %f D', (lengtheningMm, axialLengthMm, shift) => {
    expect(value('axial-shift', { lengtheningMm, axialLengthMm })).toBeCloseTo(shift, 1);
  });
});

describe('pneumatic retinopexy (read)', () => {
  it('has the published volumes', () => {
    expect(value('pneumatic-volume', { gas: 'SF6' })).toBe(0.5);
    expect(value('pneumatic-volume', { gas: 'C3F8' })).toBe(0.3);
    expect(range('pneumatic-volume', { gas: 'air' })).toEqual([0.5, 1]);
  });
});
