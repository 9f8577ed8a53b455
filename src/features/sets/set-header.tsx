import type { ReactNode } from "react";
import type { SetDetail } from "@/data/sets";
import type { Clock } from "@/format/calendar";
import { formatDayOf } from "@/format/format-date";
import { joinWords } from "@/format/join-words";
import { CourseStrip } from "@/ui/layout/course-strip";
import { PageHeader } from "@/ui/layout/page-header";
import { TitleBlock, type TitleCell } from "@/ui/layout/title-block";
import { classLimits } from "./class-limits";
import { courseSteps } from "./course-steps";
import { PromiseWords } from "./promise-words";

type Props = {
  set: SetDetail;
  clock: Clock;
  actions?: ReactNode;
  back?: ReactNode;
  /** Cells after the set's own, such as the verdict. */
  moreCells?: readonly TitleCell[];
};

/** Title, title block and course of a set: the head of its page. */
export function SetHeader({ set, clock, actions, back, moreCells = [] }: Props) {
  const inSet = set.injectors.filter(({ state }) => state === "in set").length;
  const rejected = set.injectors.filter(({ state }) => state === "rejected").length;
  const { model, toleranceClass } = set;
  const cells: TitleCell[] = [
    {
      label: "Model",
      value: `${model.make} ${model.partNumber}, ${model.impedanceBand}`,
      weight: 2,
    },
    { label: "Work asked for", value: joinWords(set.workAsked), weight: 2 },
    { label: "Injectors", value: rejected ? `${inSet}, and ${rejected} rejected` : inSet },
    { label: "Promised", value: <PromiseWords set={set} clock={clock} />, weight: 1.3 },
    { label: "Class", value: `${toleranceClass.name}, ${classLimits(toleranceClass)}`, weight: 2 },
    ...moreCells,
  ];
  return (
    <>
      <PageHeader
        title={`Set ${set.number}`}
        subtitle={
          <>
            {set.customer.name}, checked in {formatDayOf(set.checkedInAt, clock)} by {set.checkedInBy}
          </>
        }
        actions={actions}
        back={back}
      />
      <TitleBlock cells={cells}>
        <CourseStrip
          steps={courseSteps(set, clock)}
          held={
            set.hold ? `on hold since ${formatDayOf(set.hold.heldAt, clock)}: ${set.hold.reason}` : undefined
          }
        />
      </TitleBlock>
    </>
  );
}
