import type { BenchState } from "@/data/benches";
import { StatusMark } from "@/ui/feedback/status-mark";
import type { StatusKind } from "@/ui/feedback/status-mark-kind";

const kinds: Record<BenchState, StatusKind> = {
  "in calibration": "pass",
  due: "due",
  overdue: "fail",
  "on hold": "held",
  retired: "neutral",
};

/** How long it lasts is said of a bench that can be worked on. */
export function BenchStateMark({ state, until }: { state: BenchState; until?: string | null }) {
  const lasts = state === "in calibration" || state === "due";
  return (
    <StatusMark kind={kinds[state]}>
      {state}
      {lasts && until ? ` to ${until}` : ""}
    </StatusMark>
  );
}
