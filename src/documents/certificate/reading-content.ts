import "server-only";
import type { InjectorFigures, WidthFlow } from "../../metrology/cycle/types";
import type { FlowLine } from "../../metrology/line/fit-flow-line";
import type { CertificateContent, CertifiedChecks, CertifiedInjector, CertifiedPhase } from "./content";

export const phaseNames = ["as found", "as left"] as const;

export function phasesOf({ asFound, asLeft }: Pick<CertificateContent, "asFound" | "asLeft">) {
  return [asFound, asLeft] as const;
}

export function figuresOf(phase: CertifiedPhase, injectorId: string): InjectorFigures | null {
  return phase.figures.injectors.find((figures) => figures.injectorId === injectorId) ?? null;
}

export function checksOf(phase: CertifiedPhase, injectorId: string): CertifiedChecks | null {
  return phase.checks.find((checks) => checks.injectorId === injectorId) ?? null;
}

export function flowAt(phase: CertifiedPhase, injectorId: string, pulseWidthMs: number): WidthFlow | null {
  const flows = figuresOf(phase, injectorId)?.flows ?? [];
  return flows.find((flow) => flow.pulseWidthMs === pulseWidthMs) ?? null;
}

/** Every pulse width that was measured in either phase, shortest first. */
export function measuredWidths(content: CertificateContent): number[] {
  const widths = phasesOf(content).flatMap(({ figures }) =>
    figures.injectors.flatMap(({ flows }) => flows.map(({ pulseWidthMs }) => pulseWidthMs)),
  );
  return [...new Set(widths)].sort((one, other) => one - other);
}

/** A dead time without an interval is not determined, and no number is printed for it. */
export function deadTimeOf(
  line: FlowLine | null | undefined,
): { value: number; low: number; high: number } | null {
  return line?.deadTimeInterval ? { value: line.deadTimeMs, ...line.deadTimeInterval } : null;
}

/** Lines are fitted on the timer's true widths, flows named as they were set: the nearest point is meant. */
export function isInLinearRange(line: FlowLine | null, pulseWidthMs: number): boolean {
  if (!line) return false;
  const distance = (point: FlowLine["points"][number]) => Math.abs(point.pulseWidthMs - pulseWidthMs);
  const nearest = line.points.reduce((best, point) => (distance(point) < distance(best) ? point : best));
  return nearest.inLinearRange;
}

/** The part of a tag behind the set's number: 26-0147/3B is place 3B. */
export function placeOf({ tag }: CertifiedInjector): string {
  return tag.slice(tag.lastIndexOf("/") + 1);
}
