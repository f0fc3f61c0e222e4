/** The calendar day in a zone at this moment, so many days later or earlier: a clock change does not move it. */
export function dayFrom(now: Date, { zone, days }: { zone: string; days: number }): string {
  const [year, month, day] = localParts(now, zone);
  return new Date(Date.UTC(year!, month! - 1, day! + days)).toISOString().slice(0, 10);
}

/** The moment at which a clock on the wall of this zone shows this date and time. */
export function momentOf(date: string, time: string, zone: string): Date {
  const wanted = new Date(`${date}T${time}:00Z`).getTime();
  const shown = (moment: number) => {
    const [year, month, day, hour, minute] = localParts(new Date(moment), zone);
    return Date.UTC(year!, month! - 1, day!, hour!, minute!);
  };
  // twice: the first guess can stand on the other side of a clock change
  const guess = wanted - (shown(wanted) - wanted);
  return new Date(guess - (shown(guess) - wanted));
}

function localParts(moment: Date, timeZone: string): number[] {
  const format = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  });
  const parts = new Map(format.formatToParts(moment).map(({ type, value }) => [type, Number(value)]));
  return [...(['year', 'month', 'day', 'hour', 'minute'] as const)].map((part) => parts.get(part) ?? 0);
}
