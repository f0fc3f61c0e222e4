import type { Moment } from '@/api/contracts/job';

const minute = 60_000;
const hour = 60 * minute;
const day = 24 * hour;

/** The moment at which a clock on the wall of its zone shows this date and time. */
export function instantOf({ date, time, zone }: Moment): Date {
  const wanted = Date.parse(`${date}T${time}:00Z`);
  // twice: the first guess can stand on the other side of a clock change
  const guess = wanted - (wallClock(wanted, zone) - wanted);
  return new Date(guess - (wallClock(guess, zone) - wanted));
}

function wallClock(instant: number, timeZone: string): number {
  const format = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  });
  const part = new Map(format.formatToParts(instant).map(({ type, value }) => [type, value]));
  const date = `${part.get('year')}-${part.get('month')}-${part.get('day')}`;
  return Date.parse(`${date}T${part.get('hour')}:${part.get('minute')}:00Z`);
}

/** "Thursday 3 December, 14:00 in Dublin": the time as the client's clock shows it, and where that clock hangs. */
export function dueText({ date, time, zone }: Moment, now: Date): string {
  const day = new Date(`${date}T12:00:00Z`);
  const isThisYear = date.startsWith(String(now.getUTCFullYear()));
  const words = new Intl.DateTimeFormat('en-GB', {
    timeZone: 'UTC',
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    year: isThisYear ? undefined : 'numeric',
  }).format(day);
  return `${words.replace(',', '')}, ${time} in ${zoneText(zone)}`;
}

/** "Thu 3 Dec, 14:00", for a column. */
export function dueShort({ date, time }: Moment): string {
  const words = new Intl.DateTimeFormat('en-GB', { timeZone: 'UTC', weekday: 'short', day: 'numeric', month: 'short' });
  return `${words.format(new Date(`${date}T12:00:00Z`)).replace(',', '')}, ${time}`;
}

/** "3 December 2026": a day in a document's date, which has no zone. */
export const dateText = (date: string): string =>
  new Intl.DateTimeFormat('en-GB', { timeZone: 'UTC', day: 'numeric', month: 'long', year: 'numeric' }).format(
    new Date(`${date}T12:00:00Z`),
  );

export const zoneText = (zone: string): string => zone.split('/').at(-1)!.replaceAll('_', ' ');

export type Countdown = { text: string; standing: 'past' | 'today' | 'ahead' };

/** How long is left: days and hours from two days on, hours and minutes below that. */
export function countdown(due: Date, now: Date): Countdown {
  const left = due.getTime() - now.getTime();
  if (left <= 0) return { text: `${spanText(-left)} ago`, standing: 'past' };
  return { text: `in ${spanText(left)}`, standing: left < day ? 'today' : 'ahead' };
}

function spanText(span: number): string {
  if (span < minute) return 'less than a minute';
  if (span >= 14 * day) return plural(Math.round(span / day), 'day');
  if (span >= day) return joined([Math.floor(span / day), 'day'], [Math.floor((span % day) / hour), 'hour']);
  return joined([Math.floor(span / hour), 'hour'], [Math.floor((span % hour) / minute), 'minute']);
}

type Part = [count: number, word: string];
const joined = (...parts: Part[]) =>
  parts
    .filter(([count]) => count > 0)
    .map(([count, word]) => plural(count, word))
    .join(' ');

export const plural = (count: number, one: string, many = `${one}s`): string => `${count} ${count === 1 ? one : many}`;
