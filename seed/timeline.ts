import type { RecordClock } from "./record-clock";

export type Happening = { at: Date; what: () => Promise<unknown> };

/** Lets everything happen in the order of its time. */
export async function runTimeline(
  happenings: readonly Happening[],
  clock: RecordClock,
  onProgress: (done: number, of: number) => void,
): Promise<void> {
  const inOrder = happenings.toSorted((one, other) => one.at.getTime() - other.at.getTime());
  for (const [index, { at, what }] of inOrder.entries()) {
    await clock.setTo(at);
    await what();
    onProgress(index + 1, inOrder.length);
  }
}

const dayMs = 86_400_000;

/** A moment in the lab's hours, so many days ago. */
export function daysBefore(now: Date, daysAgo: number, hour: number, minute = 0): Date {
  const at = new Date(now.getTime() - daysAgo * dayMs);
  at.setUTCHours(hour, minute, 0, 0);
  return at;
}

/** So many working days later, at an hour of that day; a weekend itself counts as the Monday behind it. */
export function workdaysAfter(begin: Date, workdays: number, hour: number, minute = 0): Date {
  let at = onWorkday(begin);
  for (let day = 0; day < workdays; day++) at = onWorkday(daysAfter(at, 1));
  at.setUTCHours(hour, minute, 0, 0);
  return at;
}

function onWorkday(at: Date): Date {
  const weekday = at.getUTCDay();
  return daysAfter(at, weekday === 6 ? 2 : weekday === 0 ? 1 : 0);
}

export function dayOf(at: Date): string {
  return at.toISOString().slice(0, 10);
}

export function daysAfter(at: Date, days: number): Date {
  return new Date(at.getTime() + days * dayMs);
}
