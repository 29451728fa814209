/** The calendar day at the unit, YYYY-MM-DD. */
export const localDay = (at: Date = new Date()): string =>
  [at.getFullYear(), at.getMonth() + 1, at.getDate()].map((part) => String(part).padStart(2, '0')).join('-');

/** The day so many days later. */
export const dayAfter = (day: string, days: number): string => {
  const at = new Date(`${day}T12:00:00Z`);
  at.setUTCDate(at.getUTCDate() + days);
  return at.toISOString().slice(0, 10);
};
