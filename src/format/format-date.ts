import {
  type CalendarDay,
  type Clock,
  dayOf,
  daysBetween,
  parseDay,
  partsOf,
  twoDigits,
  weekdayOf,
} from "./calendar";
import { noFigure } from "./format-number";
import { plural } from "./plural";

const weekdays = ["Sun", "Mon", "Tue", "Wed", "Thu", "Fri", "Sat"];
const months = ["Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"];

type Instant = Date | string;
type MaybeDay = string | null | undefined;

/** A stored day: `Tue 1 Dec`, with its year when that is not this year: `Sun 14 Mar 2027`. */
export function formatDay(isoDay: MaybeDay, clock: Clock): string {
  return isoDay ? writeDay(parseDay(isoDay), clock) : noFigure;
}

/** Without weekday, always with the year, for records and certificates: `14 Mar 2027`. */
export function formatRecordDay(isoDay: MaybeDay): string {
  if (!isoDay) return noFigure;
  const { year, month, day } = parseDay(isoDay);
  return `${day} ${months[month - 1]} ${year}`;
}

/** The day of an instant in the zone, as a record writes it. */
export function formatRecordDayOf(instant: Instant | null | undefined, zone: string): string {
  if (!instant) return noFigure;
  const { year, month, day } = dayOf(new Date(instant), zone);
  return `${day} ${months[month - 1]} ${year}`;
}

/** An instant: `today 10:42`, `yesterday 16:05`, `Tue 24 Nov 09:12`. */
export function formatInstant(instant: Instant | null | undefined, clock: Clock): string {
  if (!instant) return noFigure;
  const at = partsOf(new Date(instant), clock.zone);
  return `${nearDay(at, clock) ?? writeDay(at, clock)} ${twoDigits(at.hour)}:${twoDigits(at.minute)}`;
}

/** For records, with year, seconds and zone: `24 Nov 2026, 09:12:40 UTC+1`. */
export function formatRecordInstant(instant: Instant | null | undefined, zone: string): string {
  if (!instant) return noFigure;
  const at = partsOf(new Date(instant), zone);
  const time = [at.hour, at.minute, at.second].map(twoDigits).join(":");
  return `${at.day} ${months[at.month - 1]} ${at.year}, ${time} ${at.offset}`;
}

/** The time of day alone: `10:42:03`. */
export function formatTime(instant: Instant, zone: string): string {
  const at = partsOf(new Date(instant), zone);
  return [at.hour, at.minute, at.second].map(twoDigits).join(":");
}

/** The day of an instant: `Tue 24 Nov`. */
export function formatDayOf(instant: Instant | null | undefined, clock: Clock): string {
  return instant ? writeDay(dayOf(new Date(instant), clock.zone), clock) : noFigure;
}

/** Days from today in the zone: negative when past. */
export function daysFromToday(isoDay: string, { now, zone }: Clock): number {
  return daysBetween(dayOf(now, zone), parseDay(isoDay));
}

/** A promise as people say it: `2 days late`, `today`, `tomorrow`, else the day. */
export function formatPromise(isoDay: MaybeDay, clock: Clock): string {
  if (!isoDay) return noFigure;
  const days = daysFromToday(isoDay, clock);
  if (days < 0) return `${plural(-days, "day")} late`;
  return nearDay(parseDay(isoDay), clock) ?? formatDay(isoDay, clock);
}

/** How far a due day is: `overdue by 3 days`, `due today`, `due in 12 days`. */
export function formatDue(isoDay: MaybeDay, clock: Clock): string {
  if (!isoDay) return noFigure;
  const days = daysFromToday(isoDay, clock);
  if (days < 0) return `overdue by ${plural(-days, "day")}`;
  return days === 0 ? "due today" : `due in ${plural(days, "day")}`;
}

function writeDay(day: CalendarDay, { now, zone }: Clock): string {
  const written = `${weekdays[weekdayOf(day)]} ${day.day} ${months[day.month - 1]}`;
  return day.year === dayOf(now, zone).year ? written : `${written} ${day.year}`;
}

function nearDay(day: CalendarDay, { now, zone }: Clock): string | null {
  const days = daysBetween(dayOf(now, zone), day);
  return { "-1": "yesterday", "0": "today", "1": "tomorrow" }[days] ?? null;
}
