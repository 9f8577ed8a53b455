import { formatNumber } from "../../../format/format-number";
import type { Finding } from "../results";
import type { Run } from "./run";

export type NewFinding = Omit<Finding, "acknowledged">;

/** A name for a doubt that stays the same while the reading does. */
export function findingKey(
  kind: string,
  setInjectorId: string | null,
  where: number | "open" | null,
): string {
  return `${kind.replaceAll(" ", "-")}/${setInjectorId ?? "set"}/${where ?? "all"}`;
}

/** What the arithmetic cannot see: readings that are not there, and cylinders read beyond their last mark. */
export function plainFindings(run: Run, tagOf: (setInjectorId: string) => string): NewFinding[] {
  return [...notRead(run, tagOf), ...beyondRange(run, tagOf)];
}

function notRead(run: Run, tagOf: (setInjectorId: string) => string): NewFinding[] {
  const widths = new Set(
    run.injectors.flatMap(({ readings }) => readings.map((reading) => reading.pulseWidthMs)),
  );
  return run.injectors.flatMap(({ setInjectorId, readings }) => {
    const missing = [...widths].filter(
      (width) => !readings.some((reading) => reading.pulseWidthMs === width),
    );
    return missing.map((width) => ({
      key: findingKey("not read", setInjectorId, width ?? "open"),
      kind: "not read",
      setInjectorId,
      pulseWidthMs: width,
      sentence: `${tagOf(setInjectorId)} was not read ${place(width)}, the others were.`,
    }));
  });
}

function beyondRange(run: Run, tagOf: (setInjectorId: string) => string): NewFinding[] {
  return run.injectors.flatMap(({ setInjectorId, channel, readings }) =>
    readings
      .filter((reading) => reading.amount > channel.rangeHigh)
      .map(({ pulseWidthMs, amount }) => ({
        key: findingKey("beyond the range", setInjectorId, pulseWidthMs ?? "open"),
        kind: "beyond the range",
        setInjectorId,
        pulseWidthMs,
        sentence: `${tagOf(setInjectorId)} ${place(pulseWidthMs)}: ${amount} is beyond the instrument's last mark, ${channel.rangeHigh}.`,
      })),
  );
}

function place(pulseWidthMs: number | null): string {
  return pulseWidthMs === null ? "held open" : `at ${formatNumber(pulseWidthMs, "pulseWidth")} ms`;
}
