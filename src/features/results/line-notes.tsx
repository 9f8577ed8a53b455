import type { CertifiedPhase, PresentedResults } from "@/data/certificates";
import { formatQuantity } from "@/format/format-number";

/** Under which conditions the dead times hold, and why an injector has no line. */
export function LineNotes({ results }: { results: PresentedResults }) {
  const tags = new Map(results.injectors.map(({ injectorId, tag }) => [injectorId, tag]));
  const phases = [
    { name: "As found", phase: results.asFound },
    { name: "As left", phase: results.asLeft },
  ];
  const problems = phases.flatMap(({ name, phase }) =>
    (phase?.figures.injectors ?? []).flatMap(({ injectorId, lineProblem }) =>
      lineProblem ? [`${name}, ${tags.get(injectorId)}: ${lineProblem}`] : [],
    ),
  );
  const standing = phases.flatMap(({ name, phase }) => (phase ? [`${name}: ${measuredAt(phase)}`] : []));
  return (
    <div className="flex flex-col gap-1 border-t border-hair-2 px-4 py-2.5 text-small text-ink-2">
      <p>
        Dead time is where the line over the linear range meets zero flow, with Fieller’s 95 % interval.{" "}
        {standing.join(" ")}
      </p>
      {problems.map((problem) => (
        <p key={problem} className="text-out">
          {problem}
        </p>
      ))}
    </div>
  );
}

function measuredAt({ driveVolts, pressureKpa, driverKind, fluid, figures }: CertifiedPhase): string {
  const { dynamicWithinRange } = figures.correction;
  const conditions = [
    formatQuantity(driveVolts.value, "voltage"),
    formatQuantity(pressureKpa.value, "pressure"),
    `${driverKind} driver`,
    fluid,
  ].join(", ");
  return dynamicWithinRange
    ? `${conditions}.`
    : `${conditions}; too far from the reference pressure to be brought to it.`;
}
