import type { FuelError } from "../../../documents/certificate/content";
import type { CycleFigures } from "../../../metrology/cycle/types";
import { fuelErrorCurve } from "../../../metrology/line/fuel-error-curve";

const steps = 48;

/** Over the measured widths only, closer together where pulses are short and the error grows. */
export function fuelErrorOf(figures: CycleFigures): FuelError {
  const withLine = figures.injectors.flatMap(({ injectorId, flowLine }) =>
    flowLine ? [{ injectorId, flowLine }] : [],
  );
  if (withLine.length < 2) return { pulseWidthsMs: [], injectors: [] };
  const lines = withLine.map(({ flowLine }) => flowLine);
  const pulseWidthsMs = stepsOver(figures, Math.max(...lines.map((line) => line.deadTimeMs)));
  const curve = fuelErrorCurve(lines, pulseWidthsMs);
  return {
    pulseWidthsMs,
    injectors: withLine.map(({ injectorId }, index) => ({
      injectorId,
      errorPercent: curve.map(({ errorsPercent }) => errorsPercent[index]!),
    })),
  };
}

/** From the shortest measured width at which every injector opens to the longest, in equal ratios. */
function stepsOver(figures: CycleFigures, longestDeadTimeMs: number): number[] {
  const measured = figures.injectors.flatMap((injector) => injector.flows.map((flow) => flow.pulseWidthMs));
  const to = Math.max(...measured);
  const from = Math.min(to, ...measured.filter((width) => width > longestDeadTimeMs));
  if (from === to) return [to];
  return Array.from({ length: steps + 1 }, (_, index) =>
    index === steps ? to : from * (to / from) ** (index / steps),
  );
}
