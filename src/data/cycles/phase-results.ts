import "server-only";
import type { Phase } from "../../db/vocabulary";
import { judgeSet } from "../../metrology/cycle/judge-set";
import type { CycleFigures } from "../../metrology/cycle/types";
import { decide, type Verdict } from "../../metrology/uncertainty/decide";
import { evaluateRevision } from "./evaluate-revision";
import type { Placed } from "./load-placed";
import type { LoadedRevision } from "./load-revisions";
import type { SetBasis } from "./load-set-basis";
import { withoutCycle } from "./repeated-cycles";
import type { MeasuredInjector, PhaseResults } from "./results";
import { runOfRevision } from "./sheet/run-of-revision";
import { windingAt20C } from "./sheet/winding";

type Beside = {
  basis: SetBasis;
  placed: Placed;
  leakageLimitMm3PerMin: number;
  /** The phase before this one. */
  before: PhaseResults | null;
};

/** The latest cycle of a phase in its latest revision, evaluated and judged. */
export function phaseResultsOf(
  phase: Phase,
  revisions: LoadedRevision[],
  beside: Beside,
): PhaseResults | null {
  const ofPhase = revisions.filter((revision) => revision.cycle.phase === phase);
  const number = Math.max(...ofPhase.map((revision) => revision.cycle.number));
  const ofCycle = ofPhase.filter((revision) => revision.cycle.number === number);
  const latest = ofCycle.at(-1);
  if (!latest) return null;
  const { basis, placed, before } = beside;
  const earlier = before?.figures ?? null;
  const tagOf = (id: string) => placed.get(id)?.tag ?? "An injector";
  // What was found includes what was rejected since; what is handed back does not.
  const only = phase === "as left" ? stillInSet(placed) : undefined;
  const { figures, findings } = evaluateRevision(latest, { basis, tagOf, earlier, only });
  const injectors = measuredInjectors(latest, beside);
  const acknowledged = new Set(latest.acknowledged.map((finding) => finding.key));
  const { setId: _set, ...cycle } = latest.cycle;
  return {
    ...cycle,
    latest: withoutCycle(latest),
    earlierRevisions: ofCycle.slice(0, -1).map(withoutCycle).reverse(),
    figures,
    findings: findings.map((finding) => ({ ...finding, acknowledged: acknowledged.has(finding.key) })),
    verdict: verdictOn(figures, injectors, beside, only),
    injectors,
  };
}

function stillInSet(placed: Placed): Set<string> {
  const present = [...placed.values()].filter((injector) => injector.state === "in set");
  return new Set(present.map((injector) => injector.setInjectorId));
}

function measuredInjectors(latest: LoadedRevision, { basis, placed, before }: Beside): MeasuredInjector[] {
  const { instruments } = runOfRevision(latest);
  return latest.injectors.map((injector) => {
    const { setInjectorId, checks } = injector;
    const winding = windingAt20C(checks, instruments);
    const foundBefore = before?.injectors.find((other) => other.setInjectorId === setInjectorId);
    return {
      ...injector,
      ...placed.get(setInjectorId)!,
      resistance: winding
        ? { ...winding, bandVerdict: inBand(winding, basis), measured: latest.cycle.phase }
        : (foundBefore?.resistance ?? null),
    };
  });
}

function inBand(winding: { ohmsAt20C: number; expandedUncertainty: number }, { model }: SetBasis): Verdict {
  const band = { low: model.resistanceLowOhm, high: model.resistanceHighOhm };
  return decide(winding.ohmsAt20C, band, winding.expandedUncertainty);
}

function verdictOn(
  figures: CycleFigures,
  injectors: MeasuredInjector[],
  { basis, leakageLimitMm3PerMin }: Beside,
  only: Set<string> | undefined,
) {
  const counting = injectors.filter((injector) => !only || only.has(injector.setInjectorId));
  const leakages = counting.flatMap(({ setInjectorId, checks }) =>
    checks.leakageMm3PerMin === null
      ? []
      : [{ injectorId: setInjectorId, mm3PerMin: checks.leakageMm3PerMin }],
  );
  // Leakage is judged where the class asks for it or where the lab measured it, and then on every injector.
  const judged = leakages.length > 0 || basis.toleranceClass.leakageLimitMm3PerMin !== null;
  return judgeSet({
    figures,
    toleranceClass: basis.toleranceClass,
    resistances: counting.flatMap(({ setInjectorId, resistance }) =>
      resistance ? [{ injectorId: setInjectorId, ...resistance }] : [],
    ),
    leakages,
    ...(judged ? { leakageLimit: leakageLimitMm3PerMin } : {}),
  });
}
