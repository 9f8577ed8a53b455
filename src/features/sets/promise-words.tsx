import { isOpenStage, type Stage } from "@/db/vocabulary";
import type { Clock } from "@/format/calendar";
import { formatDay, formatPromise } from "@/format/format-date";
import { plural } from "@/format/plural";
import { StatusMark } from "@/ui/feedback/status-mark";

type Promised = { promisedOn: string; daysLate: number; stage: Stage };

/** When a set is promised: how late it is while it is worked on, otherwise the day. */
export function PromiseWords({ set, clock }: { set: Promised; clock: Clock }) {
  if (set.daysLate > 0) return <StatusMark kind="late">{plural(set.daysLate, "day")} late</StatusMark>;
  const day = formatDay(set.promisedOn, clock);
  if (!isOpenStage(set.stage)) return day;
  const words = formatPromise(set.promisedOn, clock);
  return words === day ? day : `${day}, ${words}`;
}
