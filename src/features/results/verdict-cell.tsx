import type { PresentedResults } from "@/data/certificates";
import { StatusMark } from "@/ui/feedback/status-mark";
import type { TitleCell } from "@/ui/layout/title-block";

/** The verdict in the title block, as soon as there is one. */
export function verdictCell({ asFound, asLeft }: PresentedResults): TitleCell[] {
  const phase = asLeft ?? asFound;
  if (!phase) return [];
  return [
    {
      label: asLeft ? "Verdict as left" : "Verdict as found",
      value: <StatusMark kind={phase.verdict.verdict ?? "neutral"} />,
      weight: 1.3,
    },
  ];
}
