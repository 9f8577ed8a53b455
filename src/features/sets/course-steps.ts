import type { SetDetail } from "@/data/sets";
import type { Clock } from "@/format/calendar";
import { formatDayOf } from "@/format/format-date";
import type { CourseStep } from "@/ui/layout/course-strip";

type Stage = SetDetail["stage"];

const wholeCourse: Stage[] = [
  "checked in",
  "as found",
  "cleaning",
  "as left",
  "in review",
  "certified",
  "handed over",
];

/** The steps a set has taken and has before it; one that is returned uncleaned skips the rest. */
export function courseSteps(
  { course, stage }: Pick<SetDetail, "course" | "stage">,
  clock: Clock,
): CourseStep[] {
  const returned = course.some(({ to }) => to === "returned uncleaned");
  const taken = new Set(course.map(({ to }) => to));
  const stages: Stage[] = returned
    ? [
        ...wholeCourse.filter((each) => taken.has(each) && each !== "handed over"),
        "returned uncleaned",
        "handed over",
      ]
    : wholeCourse;
  const now = stages.indexOf(stage);
  return stages.map((each, at) => {
    const last = course.findLast(({ to }) => to === each);
    return {
      label: capital(each),
      state: at < now || stage === "handed over" ? "done" : at === now ? "now" : "next",
      note: last && at <= now ? `${formatDayOf(last.at, clock)}, ${last.by}` : undefined,
    };
  });
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
