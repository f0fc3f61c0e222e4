/** The calendar date of an instant in a zone: 2026-03-12. */
export const dateIn = (instant: Date, timeZone: string): string =>
  new Intl.DateTimeFormat('en-CA', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' }).format(instant);

/** So many calendar days later; clock changes do not matter to a date. */
export function daysAfter(date: string, days: number): string {
  const later = new Date(`${date}T00:00:00Z`);
  later.setUTCDate(later.getUTCDate() + days);
  return later.toISOString().slice(0, 10);
}
