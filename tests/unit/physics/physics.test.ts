import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { equatorMm, globeOf, parallelMm } from '../../../src/domain/anatomy/globe.ts';
import {
  curveLengthMm,
  heightFromShortening,
  overlapMm,
  shorteningForHeight,
} from '../../../src/domain/physics/band.ts';
import {
  arcOfFill,
  capVolumeMl,
  cavityMl,
  coverDegrees,
  positionsThatCover,
} from '../../../src/domain/physics/bubble.ts';
import { compute, formulas } from '../../../src/domain/physics/formulas.ts';
import {
  daysUntil,
  gases,
  halfLifeDays,
  percentOf,
  pureMl,
  remaining,
  spanDays,
} from '../../../src/domain/physics/gas.ts';
import { numbersOf } from '../../../src/domain/physics/numbers.ts';
import { shiftFromLengthening } from '../../../src/domain/physics/refraction.ts';
import { holds, layBreak, layElement, supportBy, supportByAll } from '../../../src/domain/physics/support.ts';
import { strengthLeft } from '../../../src/domain/physics/sutures.ts';
import { specsOnPath } from '../../../src/domain/record/field-tree.ts';
import { anyRecord } from '../../support/any-record.ts';
import { cleanRecord } from '../../support/clinical/generate.ts';

const positive = (max: number) => fc.double({ min: 0.01, max, noNaN: true });

describe('band', () => {
  it('has height and shortening that are each other’s inverse', () => {
    fc.assert(
      fc.property(positive(40), (mm) => {
        expect(shorteningForHeight(heightFromShortening(mm))).toBeCloseTo(mm, 9);
      }),
    );
  });

  it('measures a parallel by steps as by its formula', () => {
    fc.assert(
      fc.property(positive(20), fc.double({ min: 20, max: 32, noNaN: true }), (mm, length) => {
        const globe = globeOf(length);
        expect(curveLengthMm(globe, () => mm, { from: 6, to: 6 })).toBeCloseTo(parallelMm(globe, mm), 6);
        expect(curveLengthMm(globe, () => mm, { from: 11, to: 2 })).toBeCloseTo(parallelMm(globe, mm) / 4, 6);
      }),
    );
  });

  it('overlaps by what is left', () => {
    expect(overlapMm(75, 71, 5)).toBe(9);
  });
});

describe('gas', () => {
  it('dilutes and reads back the same, dead space or not', () => {
    fc.assert(
      fc.property(
        positive(100),
        positive(100),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (syringe, percent, dead) => {
          expect(percentOf(pureMl(syringe, percent, dead), syringe, dead)).toBeCloseTo(percent, 8);
        },
      ),
    );
  });

  it('goes steadily, faster without a lens, and by the days that were asked for', () => {
    fc.assert(
      fc.property(fc.constantFrom(...gases), positive(100), positive(100), (gas, percent, days) => {
        const { low, high } = halfLifeDays(gas, percent, 'phakic');
        expect(low).toBeLessThanOrEqual(high);
        expect(halfLifeDays(gas, percent, 'aphakic').low).toBeLessThanOrEqual(low);
        expect(remaining(days, low)).toBeGreaterThan(remaining(days + 1, low));
        expect(daysUntil(remaining(days, low), low)).toBeCloseTo(days, 6);
        const span = spanDays(gas, percent, 'phakic');
        expect(span.low).toBeLessThan(span.high);
      }),
    );
  });
});

describe('bubble', () => {
  it('finds the arc of a volume and the volume of an arc', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 359, noNaN: true }), positive(14), (arc, radius) => {
        const fill = capVolumeMl(arc, radius) / cavityMl(radius);
        expect(arcOfFill(fill)).toBeCloseTo(arc, 2);
      }),
    );
    expect([arcOfFill(0), arcOfFill(0.5), arcOfFill(1)].map((arc) => Math.round(arc))).toEqual([0, 180, 360]);
  });

  it('sums the cap by slices to its closed form', () => {
    const [radius, arc] = [10.5, 130];
    const height = radius * (1 - Math.cos((arc * Math.PI) / 360));
    const slices = 20_000;
    let volume = 0;
    for (let slice = 0; slice < slices; slice += 1) {
      const y = radius - ((slice + 0.5) * height) / slices;
      volume += (Math.PI * (radius ** 2 - y ** 2) * height) / slices;
    }
    expect(capVolumeMl(arc, radius)).toBeCloseTo(volume / 1000, 6);
  });

  it('covers more as it grows, and heavy where light does not', () => {
    const globe = globeOf(24);
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 0.9, noNaN: true }), (fill) => {
        const place = { clock: 6, mm: 12 };
        const cover = (of: number) => coverDegrees(globe, place, of, 'upright') ?? 0;
        expect(cover(fill + 0.05)).toBeGreaterThan(cover(fill));
        const heavy = coverDegrees(globe, place, fill, 'upright', 'sinks') ?? 0;
        expect(heavy).toBeGreaterThan(cover(fill));
      }),
    );
    expect(positionsThatCover(globe, { clock: 12, mm: 12 }, 0.3)[0]).toBe('upright');
  });
});

describe('sutures', () => {
  it('never grow stronger', () => {
    fc.assert(
      fc.property(
        fc.constantFrom('polyglactin-910', 'polydioxanone', 'nylon'),
        fc.nat(300),
        (material, day) => {
          expect(strengthLeft(material, day + 1)?.high).toBeLessThanOrEqual(
            strengthLeft(material, day)?.high ?? 0,
          );
        },
      ),
    );
    expect(strengthLeft('cotton', 3)).toBeUndefined();
  });
});

describe('refraction', () => {
  it('is unchanged by nothing, and more myopic the longer the eye', () => {
    expect(shiftFromLengthening(0)).toBeCloseTo(0, 9);
    fc.assert(
      fc.property(positive(2), (mm) => {
        expect(shiftFromLengthening(mm + 0.1)).toBeLessThan(shiftFromLengthening(mm));
      }),
    );
  });
});

describe('support', () => {
  const globe = globeOf(24);
  const band = {
    role: 'encircling',
    widthMm: 3.5,
    frontEdgeMm: 3,
    frontEdgeReference: 'insertions',
  } as const;

  it('holds what lies between the edges, with the margins to spare', () => {
    const element = layElement(band, globe, 'left');
    const lying = layBreak({ clock: 2, frontEdgeMm: 11, backEdgeMm: 12.5 }, globe, 'left');
    const support = element === undefined || lying === undefined ? undefined : supportBy(lying, element);
    expect(support !== undefined && holds(support)).toBe(true);
    expect(lying !== undefined && element !== undefined && supportByAll(lying, [element])).toEqual({
      shortfallMm: 0,
      bare: 0,
    });
  });

  it('joins a band and an implant under it', () => {
    const implant = {
      role: 'meridional',
      widthMm: 6,
      lengthMm: 9,
      meridianClock: 4.5,
      frontEdgeMm: 8,
      frontEdgeReference: 'limbus',
    } as const;
    const lying = layBreak({ clock: 4.5, frontEdgeMm: 12, backEdgeMm: 16 }, globe, 'left');
    const [one, two] = [layElement(band, globe, 'left'), layElement(implant, globe, 'left')];
    if (lying === undefined || one === undefined || two === undefined) throw new Error('not laid');
    expect(supportByAll(lying, [one]).shortfallMm).toBeGreaterThan(1);
    expect(supportByAll(lying, [one, two]).shortfallMm).toBe(0);
  });

  it('cannot tell while too little is recorded', () => {
    expect(layElement({ role: 'encircling' }, globe, 'left')).toBeUndefined();
    expect(layBreak({ clock: 2 }, globe, 'left')).toBeUndefined();
  });
});

describe('compute', () => {
  it.each(Object.entries(formulas))(
    '%s says what it is and answers its usual inputs or says what is missing',
    (name, formula) => {
      for (const text of [formula.title, formula.formula, formula.source])
        expect(text.length).toBeGreaterThan(2);
      const answer = compute(name, {});
      if (!answer.ok) expect(answer.error.code).toBe('missing');
    },
  );

  it('refuses what it does not know in one sentence', () => {
    expect(compute('shortening-height', { shorteningMm: -1 })).toMatchObject({
      ok: false,
      error: { code: 'out-of-range' },
    });
    expect(compute('shortening-height', { length: 1 })).toMatchObject({
      ok: false,
      error: { code: 'unknown-input' },
    });
    expect(compute('gas-half-life', { gas: 'helium', percent: 20 })).toMatchObject({
      ok: false,
      error: { code: 'unknown' },
    });
  });
});

describe('numbersOf', () => {
  it('gives every figure a unit, a source and a sentence that calls an estimate one', () => {
    for (let seed = 1; seed <= 150; seed += 1) {
      for (const figure of numbersOf(cleanRecord(seed))) {
        expect(figure.unit).not.toBe('');
        expect(figure.source).not.toBe('');
        expect(figure.sentence).not.toMatch(/NaN|undefined|Infinity/);
        if (!/dilution/.test(figure.id)) expect(figure.sentence).toMatch(/estimate|published/);
      }
    }
  });

  it('reads any record, and names fields that exist', () => {
    fc.assert(
      fc.property(anyRecord, (record) => {
        for (const { fields, sentence } of numbersOf(record)) {
          expect(sentence).not.toMatch(/NaN|undefined/);
          for (const field of fields) expect(specsOnPath(field), field).not.toEqual([]);
        }
      }),
      { numRuns: 500 },
    );
  });

  it('says what it took for granted', () => {
    const [figure] = numbersOf({
      version: 1,
      buckle: {
        elements: [{ role: 'encircling', widthMm: 3.5, frontEdgeMm: 3, frontEdgeReference: 'insertions' }],
      },
    });
    expect(figure?.assumed).toEqual(['an axial length of 24 mm', 'a right eye']);
    expect(equatorMm(globeOf())).toBeCloseTo(12.68, 2);
  });
});
