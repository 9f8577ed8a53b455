import { describe, expect, test } from "vitest";
import { daysBetween, isoDayAfter, parseDay } from "@/format/calendar";
import {
  daysFromToday,
  formatDay,
  formatDue,
  formatInstant,
  formatPromise,
  formatRecordDay,
  formatRecordInstant,
} from "@/format/format-date";

const berlin = { now: new Date("2026-12-01T10:00:00Z"), zone: "Europe/Berlin" };

test.each([
  ["2026-12-01", "Tue 1 Dec"],
  ["2027-03-14", "Sun 14 Mar 2027"],
  ["2026-02-28", "Sat 28 Feb"],
])("%s is %s", (day, text) => expect(formatDay(day, berlin)).toBe(text));

test.each([
  ["2026-12-01T09:42:00Z", "today 10:42"],
  ["2026-11-30T15:05:00Z", "yesterday 16:05"],
  ["2026-11-30T23:30:00Z", "today 00:30"],
  ["2026-11-24T08:12:00Z", "Tue 24 Nov 09:12"],
  ["2025-11-24T08:12:00Z", "Mon 24 Nov 2025 09:12"],
])("%s in Berlin is %s", (instant, text) => expect(formatInstant(instant, berlin)).toBe(text));

describe("records carry year, seconds and zone", () => {
  test.each([
    ["Europe/Berlin", "24 Nov 2026, 09:12:40 UTC+1"],
    ["UTC", "24 Nov 2026, 08:12:40 UTC"],
    ["Asia/Kolkata", "24 Nov 2026, 13:42:40 UTC+5:30"],
    ["America/St_Johns", "24 Nov 2026, 04:42:40 UTC−3:30"],
  ])("%s: %s", (zone, text) => expect(formatRecordInstant("2026-11-24T08:12:40Z", zone)).toBe(text));

  test("a day", () => expect(formatRecordDay("2027-03-14")).toBe("14 Mar 2027"));
});

test.each([
  ["2026-11-29", "2 days late", "overdue by 2 days"],
  ["2026-11-30", "1 day late", "overdue by 1 day"],
  ["2026-12-01", "today", "due today"],
  ["2026-12-02", "tomorrow", "due in 1 day"],
  ["2026-12-13", "Sun 13 Dec", "due in 12 days"],
])("promised for %s: %s; %s", (day, promise, due) => {
  expect(formatPromise(day, berlin)).toBe(promise);
  expect(formatDue(day, berlin)).toBe(due);
});

describe("days", () => {
  test("are counted by the calendar, also where clocks change", () => {
    expect(daysBetween(parseDay("2026-03-28"), parseDay("2026-03-30"))).toBe(2);
    expect(daysBetween(parseDay("2026-10-24"), parseDay("2026-10-26"))).toBe(2);
    expect(daysBetween(parseDay("2024-02-28"), parseDay("2024-03-01"))).toBe(2);
  });

  test.each([
    ["2026-10-24T22:30:00Z", 1, "2026-10-26"],
    ["2026-03-28T22:59:00Z", 1, "2026-03-29"],
    ["2026-12-31T12:00:00Z", 1, "2027-01-01"],
    ["2026-12-01T10:00:00Z", 0, "2026-12-01"],
    ["2026-12-01T10:00:00Z", -1, "2026-11-30"],
  ])("in Berlin at %s, %s on: %s", (now, days, day) =>
    expect(isoDayAfter({ now: new Date(now), zone: "Europe/Berlin" }, days)).toBe(day),
  );

  test("today is the lab's, not the server's", () => {
    const late = { now: new Date("2026-12-01T23:30:00Z"), zone: "Pacific/Auckland" };
    expect(daysFromToday("2026-12-02", late)).toBe(0);
  });
});

test("no day is a dash; what is none is refused", () => {
  expect(formatDay(null, berlin)).toBe("–");
  expect(formatInstant(undefined, berlin)).toBe("–");
  expect(() => parseDay("14.3.2026")).toThrow(/"14.3.2026" is not a day such as 2026-03-14/);
});
