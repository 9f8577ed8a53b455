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

export function BenchStateMark({ state, until }: { state: BenchState; until?: string | null }) {
  return (
    <StatusMark kind={kinds[state]}>
      {state}
      {until ? ` to ${until}` : ""}
    </StatusMark>
  );
}
