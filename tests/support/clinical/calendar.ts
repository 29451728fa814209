const DAY = 86_400_000;

const iso = (instant: number) => new Date(instant).toISOString();

export const addDays = (date: string, days: number): string =>
  iso(Date.parse(`${date}T00:00:00Z`) + days * DAY).slice(0, 10);

export const addMinutes = (dateTime: string, minutes: number): string =>
  iso(Date.parse(`${dateTime}:00Z`) + minutes * 60_000).slice(0, 16);

/** Whole days from one date to another. */
export const daysBetween = (from: string, to: string): number =>
  Math.round((Date.parse(`${to}T00:00:00Z`) - Date.parse(`${from}T00:00:00Z`)) / DAY);

export const dateOf = (dateTime: string): string => dateTime.slice(0, 10);
