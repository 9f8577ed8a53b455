import type { PresentedResults } from "@/data/certificates";
import { Sheet } from "@/ui/layout/sheet";
import { ChecksTable } from "./checks-table";
import { ConditionsSheet } from "./conditions-sheet";
import { FlowLinesTable } from "./flow-lines-table";
import { LineNotes } from "./line-notes";
import { RailStripSheet } from "./rail-strip-sheet";
import { ResultsTable } from "./results-table";
import { VerdictTable } from "./verdict-table";

/** The head of a set's results: the rail strip, what it was measured under, every figure, the verdict. */
export function ResultsHead({ results, zone }: { results: PresentedResults; zone: string }) {
  const { name, revision } = results.toleranceClass;
  return (
    <>
      <div className="grid gap-3.5 laptop:grid-cols-[2fr_1fr]">
        <RailStripSheet results={results} />
        <ConditionsSheet results={results} zone={zone} />
      </div>
      <Sheet title="Results" note={tableNote(results)} padding="none">
        <ResultsTable results={results} />
      </Sheet>
      <Sheet title="Verdict" note={`tolerance class ${name}, revision ${revision}`} padding="none">
        <VerdictTable results={results} />
      </Sheet>
    </>
  );
}

function tableNote({ asFound, asLeft }: PresentedResults): string {
  const states = asFound && asLeft ? "as found small above, as left below" : "as found";
  return `${states}; spread is 100 · (max − min) / mean, for dead time and winding the plain range`;
}

/** What stands behind the figures: dead times with their intervals, and the checks of each injector. */
export function ResultsDetail({ results }: { results: PresentedResults }) {
  return (
    <>
      <Sheet title="Flow lines and dead times" padding="none">
        <FlowLinesTable results={results} />
        <LineNotes results={results} />
      </Sheet>
      <Sheet title="Winding, leakage and spray" padding="none">
        <ChecksTable results={results} />
      </Sheet>
    </>
  );
}
