import type { Context } from "@/data/access/actor";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import type { Clock } from "@/format/calendar";

/** The lab's own time, by which its pages tell days. */
export async function labClock(context: Context): Promise<Clock> {
  return (await answerPage(getLabCard(context))).clock;
}
