import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  readClock,
  readDate,
  readDateTime,
  readNumber,
  readNumbers,
  showClock,
  showDate,
  showDateTime,
  showNumber,
} from '../../../src/components/ui/entry.ts';

const bounds = { min: 0, max: 40, whole: false, unit: 'mm' };
const now = '2026-12-01T10:42';

const value = <T>(reading: { ok: true; value: T } | { ok: false }) =>
  reading.ok ? reading.value : 'unreadable';

describe('numbers as they are typed', () => {
  it.each([
    ['3.5', 3.5],
    ['3,5', 3.5],
    [' 12 ', 12],
    ['.75', 0.75],
    ['', undefined],
  ])('reads %j', (typed, expected) => expect(value(readNumber(typed, bounds))).toBe(expected));

  it.each(['four', '3.5mm', '1.2.3', '-1', '41', '1e3', '--2'])('does not guess at %j', (typed) =>
    expect(readNumber(typed, bounds).ok).toBe(false),
  );

  it('says the bound and its unit', () => {
    const reading = readNumber('41', bounds);
    expect(reading.ok ? '' : reading.error.message).toBe('Write at most 40 mm.');
  });

  it('takes whole numbers only where things are counted', () =>
    expect(readNumber('1.5', { ...bounds, whole: true }).ok).toBe(false));

  it('reads what it shows', () =>
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 4000 }), (hundredths) => {
        expect(value(readNumber(showNumber(hundredths / 100), bounds))).toBe(hundredths / 100);
      }),
    ));
});

describe('clock hours as they are typed', () => {
  it.each([
    ['2', 2],
    ['4:30', 4.5],
    ['4.5', 4.5],
    ['4,5', 4.5],
    ['12:30', 12.5],
    ['0:30', 12.5],
    ['11:15', 11.25],
    ['6 o’clock', 6],
  ])('reads %j', (typed, expected) => expect(value(readClock(typed))).toBe(expected));

  it.each(['13', '4:10', 'noon', '25', '-1'])('does not guess at %j', (typed) =>
    expect(readClock(typed).ok).toBe(false),
  );

  it('reads what it shows, round the clock', () =>
    fc.assert(
      fc.property(fc.integer({ min: 4, max: 51 }), (quarters) => {
        expect(value(readClock(showClock(quarters / 4)))).toBe(quarters / 4);
      }),
    ));
});

describe('days and times as they are typed', () => {
  it.each([
    ['2029-08-31', '2029-08-31'],
    ['31.8.2029', '2029-08-31'],
    ['31/8/2029', '2029-08-31'],
    ['31 8 2029', '2029-08-31'],
    ['31 Aug 2029', '2029-08-31'],
    ['31 August 2029', '2029-08-31'],
    ['today', '2026-12-01'],
    ['', undefined],
  ])('reads %j', (typed, expected) => expect(value(readDate(typed, now))).toBe(expected));

  it.each(['31 2 2029', '31.8.29', '31 Foo 2029', 'soon', '2029-13-01'])('does not guess at %j', (typed) =>
    expect(readDate(typed, now).ok).toBe(false),
  );

  it.each([
    ['now', '2026-12-01T10:42'],
    ['9:05', '2026-11-30T09:05'],
    ['0905', '2026-11-30T09:05'],
    ['1 Dec 2026, 10:42', '2026-12-01T10:42'],
    ['2026-12-01T10:42', '2026-12-01T10:42'],
    ['today 8:00', '2026-12-01T08:00'],
  ])('reads %j', (typed, expected) => expect(value(readDateTime(typed, now, '2026-11-30'))).toBe(expected));

  it.each(['25:00', '9:60', 'yesterday 9:00', '31 2 2029 9:00'])('does not guess at %j', (typed) =>
    expect(readDateTime(typed, now, '2026-11-30').ok).toBe(false),
  );

  it('reads what it shows', () => {
    expect(value(readDate(showDate('2029-08-31'), now))).toBe('2029-08-31');
    expect(value(readDateTime(showDateTime(now), now, '2020-01-01'))).toBe(now);
  });
});

describe('numbers of breaks and elements', () => {
  it('reads lists, each number once', () => {
    expect(value(readNumbers('1, 2'))).toEqual([1, 2]);
    expect(value(readNumbers('1 2 and 2'))).toEqual([1, 2]);
    expect(value(readNumbers(''))).toBeUndefined();
  });

  it.each(['0', 'one', '1.5', '1, x'])('does not guess at %j', (typed) =>
    expect(readNumbers(typed).ok).toBe(false),
  );
});
