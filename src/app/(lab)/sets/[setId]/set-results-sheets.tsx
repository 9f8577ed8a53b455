import type { PresentedResults } from "@/data/certificates";
import type { SetResults } from "@/data/cycles/results";
import type { SetDetail } from "@/data/sets";
import { PhotosPanel } from "@/features/photos/photos-panel";
import { CalibrationsTable } from "@/features/results/calibrations-table";
import { CleaningRunsTable } from "@/features/results/cleaning-runs-table";
import { FindingsList } from "@/features/results/findings-list";
import { Pictures } from "@/features/results/pictures";
import { ResultsDetail, ResultsHead } from "@/features/results/results-sheets";
import type { Clock } from "@/format/calendar";
import { EmptyState } from "@/ui/layout/empty-state";
import { Sheet } from "@/ui/layout/sheet";

type Props = {
  set: SetDetail;
  presented: PresentedResults;
  results: SetResults;
  clock: Clock;
  roles: readonly string[];
};

/** Figures, pictures and what they rest on, from the top down as on the certificate. */
export function SetResultsSheets({ set, presented, results, clock, roles }: Props) {
  const photos = <PhotosPanel set={set} clock={clock} roles={roles} />;
  const phases = [results.asFound, results.asLeft].filter((phase) => phase !== null);
  if (phases.length === 0)
    return (
      <>
        <Sheet>
          <EmptyState title="Nothing is measured yet">
            The rail strip, flow lines and the verdict appear with the first recorded cycle.
          </EmptyState>
        </Sheet>
        {photos}
      </>
    );
  const findings = phases.flatMap(({ phase, findings: found }) =>
    found.map((finding) => ({ phase, finding })),
  );
  return (
    <>
      <ResultsHead results={presented} zone={clock.zone} />
      <Pictures results={presented} />
      <ResultsDetail results={presented} />
      <Sheet title="Doubtful readings">
        <FindingsList findings={findings} />
      </Sheet>
      <Sheet title="Cleaning" padding="none">
        <CleaningRunsTable runs={results.cleaningRuns} zone={clock.zone} />
      </Sheet>
      {photos}
      <Sheet title="Calibrations used" note="in force when it was measured" padding="none">
        <CalibrationsTable phases={phases} zone={clock.zone} />
      </Sheet>
    </>
  );
}
