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
const settledAfterDays = 7;

/** A moment in the lab's working hours, so many days ago; long ago never on a weekend. */
export function workMoment(now: Date, daysAgo: number, hour: number, minute = 0): Date {
  const at = new Date(now.getTime() - daysAgo * dayMs);
  at.setUTCHours(hour, minute, 0, 0);
  const weekday = at.getUTCDay();
  if (daysAgo > settledAfterDays && weekday === 6) at.setTime(at.getTime() - dayMs);
  if (daysAgo > settledAfterDays && weekday === 0) at.setTime(at.getTime() + dayMs);
  return at;
}

export function dayOf(at: Date): string {
  return at.toISOString().slice(0, 10);
}

export function daysAfter(at: Date, days: number): Date {
  return new Date(at.getTime() + days * dayMs);
}
