/** The moment and the place that a date is read at; both are handed in, so that every function here is pure. */
export type Clock = { now: Date; zone: string };

export type CalendarDay = { year: number; month: number; day: number };

const dayLength = 86_400_000;

/** The calendar day of an instant in a zone. */
export function dayOf(instant: Date, zone: string): CalendarDay {
  const { year, month, day } = partsOf(instant, zone);
  return { year, month, day };
}

export function parseDay(iso: string): CalendarDay {
  const match = /^(\d{4})-(\d{2})-(\d{2})/.exec(iso);
  if (!match) throw new RangeError(`"${iso}" is not a day such as 2026-03-14.`);
  return { year: Number(match[1]), month: Number(match[2]), day: Number(match[3]) };
}

export function isoDay({ year, month, day }: CalendarDay): string {
  return [String(year).padStart(4, "0"), twoDigits(month), twoDigits(day)].join("-");
}

/** The day so many days after today by a clock, whatever the clocks do in between: `2026-03-14`. */
export function isoDayAfter({ now, zone }: Clock, days: number): string {
  const then = new Date(atNoon(dayOf(now, zone)) + days * dayLength);
  return isoDay(dayOf(then, "UTC"));
}

/** Days from one calendar day to the next, whatever the clocks do in between. */
export function daysBetween(from: CalendarDay, to: CalendarDay): number {
  return Math.round((atNoon(to) - atNoon(from)) / dayLength);
}

/** 0 is Sunday. */
export function weekdayOf(day: CalendarDay): number {
  return new Date(atNoon(day)).getUTCDay();
}

type Parts = CalendarDay & { hour: number; minute: number; second: number; offset: string };

/** Read with Latin digits, since the names of months differ between one engine's tables and another's. */
export function partsOf(instant: Date, zone: string): Parts {
  const read: Record<string, string> = {};
  for (const { type, value } of formatterFor(zone).formatToParts(instant)) read[type] = value;
  return {
    year: Number(read.year),
    month: Number(read.month),
    day: Number(read.day),
    hour: Number(read.hour),
    minute: Number(read.minute),
    second: Number(read.second),
    offset: offsetLabel(read.timeZoneName ?? ""),
  };
}

const formatters = new Map<string, Intl.DateTimeFormat>();

function formatterFor(zone: string): Intl.DateTimeFormat {
  const known = formatters.get(zone);
  if (known) return known;
  const made = new Intl.DateTimeFormat("en-GB", {
    timeZone: zone,
    year: "numeric",
    month: "2-digit",
    day: "2-digit",
    hour: "2-digit",
    minute: "2-digit",
    second: "2-digit",
    hourCycle: "h23",
    timeZoneName: "longOffset",
  });
  formatters.set(zone, made);
  return made;
}

/** "GMT+05:30" → "UTC+5:30"; "GMT" and "GMT+00:00", as engines differ, → "UTC". */
function offsetLabel(offset: string): string {
  const match = /^GMT(?:([+\-\u2212])(\d{2}):(\d{2}))?$/.exec(offset);
  if (!match?.[1] || `${match[2]}${match[3]}` === "0000") return "UTC";
  const minutes = match[3] === "00" ? "" : `:${match[3]}`;
  return `UTC${match[1] === "+" ? "+" : "\u2212"}${Number(match[2])}${minutes}`;
}

function atNoon({ year, month, day }: CalendarDay): number {
  return Date.UTC(year, month - 1, day, 12);
}

export function twoDigits(value: number): string {
  return String(value).padStart(2, "0");
}
