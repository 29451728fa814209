import { fail, ok, type Result } from '../../domain/result.ts';

/** What was typed, read: a value, `undefined` for an empty box, or why it cannot be read. */
export type Reading<T> = Result<T | undefined>;

const unreadable = (message: string) => fail('unreadable', message);

/** Shortest writing of a number, with a point. */
export const showNumber = (value: number): string => String(value);

export interface NumberBounds {
  min: number;
  max: number;
  whole: boolean;
  unit: string;
}

const withUnit = (value: number, unit: string) => (unit === '' ? String(value) : `${value} ${unit}`);

/** Reads a number written with a decimal point or comma. Errors say the bounds and the unit. */
export const readNumber = (typed: string, bounds: NumberBounds): Reading<number> => {
  const text = typed.trim().replace(',', '.').replace('−', '-');
  if (text === '') return ok(undefined);
  if (!/^-?(\d+\.?\d*|\.\d+)$/.test(text)) return unreadable('Write a number here.');
  const value = Number(text);
  if (bounds.whole && !Number.isInteger(value)) return unreadable('Write a whole number.');
  if (value < bounds.min) return unreadable(`Write at least ${withUnit(bounds.min, bounds.unit)}.`);
  if (value > bounds.max) return unreadable(`Write at most ${withUnit(bounds.max, bounds.unit)}.`);
  return ok(value);
};

/** A clock hour as the trade writes it: 2, 4:30, 11:15. */
export const showClock = (value: number): string => {
  const hour = Math.floor(value);
  const minutes = Math.round((value - hour) * 60);
  return minutes === 0 ? String(hour) : `${hour}:${String(minutes).padStart(2, '0')}`;
};

/** Reads a clock hour: "2", "4:30", "4.5", "4,5", "12:30". */
export const readClock = (typed: string): Reading<number> => {
  const text = typed.trim().replace(/\s*o.?clock$/i, '');
  if (text === '') return ok(undefined);
  const parts = /^(\d{1,2}):([0-5]\d)$/.exec(text);
  const value = parts === null ? Number(text.replace(',', '.')) : Number(parts[1]) + Number(parts[2]) / 60;
  if (!Number.isFinite(value)) return unreadable('Write a clock hour: 2, or 4:30.');
  const hour = value >= 0 && value < 1 ? value + 12 : value;
  if (hour < 1 || hour >= 13) return unreadable('Write a clock hour from 1 to 12:45.');
  if (!Number.isInteger(hour * 4)) return unreadable('Write whole, half or quarter hours: 4:30.');
  return ok(hour);
};

const months = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];
const monthNames = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const pad = (value: number, width = 2) => String(value).padStart(width, '0');

/** A day as people read it: 31 Aug 2029. What is no day is shown as it is. */
export const showDate = (iso: string): string => {
  const [year, month, day] = iso.slice(0, 10).split('-').map(Number);
  const name = monthNames[(month ?? 0) - 1];
  return name === undefined ? iso : `${day} ${name} ${year}`;
};

const calendarDay = (year: number, month: number, day: number): Reading<string> => {
  const date = new Date(Date.UTC(year, month - 1, day));
  return date.getUTCFullYear() === year && date.getUTCMonth() === month - 1 && date.getUTCDate() === day
    ? ok(`${pad(year, 4)}-${pad(month)}-${pad(day)}`)
    : unreadable('There is no such day in the calendar.');
};

/** Reads a day: 2029-08-31, 31.8.2029, 31/8/2029, 31 Aug 2029, or "today". `now` is local, YYYY-MM-DDTHH:MM. */
export const readDate = (typed: string, now: string): Reading<string> => {
  const text = typed.trim().toLowerCase();
  if (text === '') return ok(undefined);
  if (text === 'today') return ok(now.slice(0, 10));
  const iso = /^(\d{4})-(\d{1,2})-(\d{1,2})$/.exec(text);
  if (iso !== null) return calendarDay(Number(iso[1]), Number(iso[2]), Number(iso[3]));
  const parts = /^(\d{1,2})[\s./-]+(\d{1,2}|[a-z]{3,9})[\s./-]+(\d+)$/.exec(text);
  if (parts === null) return unreadable('Write the date as 31 8 2029, or “today”.');
  const [, day = '', month = '', year = ''] = parts;
  if (year.length !== 4) return unreadable('Write the year with four digits.');
  const number = /^\d/.test(month) ? Number(month) : months.indexOf(month.slice(0, 3)) + 1;
  return calendarDay(Number(year), number, Number(day));
};

/** A local time as people read it: 1 Dec 2026, 10:42. */
export const showDateTime = (value: string): string => `${showDate(value)}, ${value.slice(11, 16)}`;

/**
 * Reads a local time: a day and HH:MM, HH:MM alone for the day of the operation, or "now". `now` and `day` are
 * local, YYYY-MM-DDTHH:MM and YYYY-MM-DD.
 */
export const readDateTime = (typed: string, now: string, day: string): Reading<string> => {
  const text = typed.trim().toLowerCase();
  if (text === '') return ok(undefined);
  if (text === 'now') return ok(now);
  const parts = /^(?:(.+?)(?:[\s,]+|t))?([01]?\d|2[0-3]):?([0-5]\d)$/.exec(text);
  if (parts === null) return unreadable('Write a day and a time, or the time alone: 10:42, or “now”.');
  const [, before = '', hour = '', minute = ''] = parts;
  const date = before === '' ? ok(day) : readDate(before, now);
  return date.ok && date.value !== undefined ? ok(`${date.value}T${pad(Number(hour))}:${minute}`) : date;
};

/** Reads numbers of breaks or elements: "1, 2" or "1 2". */
export const readNumbers = (typed: string): Reading<number[]> => {
  const text = typed.trim();
  if (text === '') return ok(undefined);
  const values = text.split(/[\s,;]+|\band\b/).filter((part) => part !== '');
  const numbers = values.map(Number);
  return numbers.every((value) => Number.isInteger(value) && value >= 1 && value <= 40)
    ? ok([...new Set(numbers)])
    : unreadable('Write numbers: 1, 2.');
};

export const showNumbers = (values: readonly number[]): string => values.join(', ');
