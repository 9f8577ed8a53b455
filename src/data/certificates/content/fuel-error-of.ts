import type { FuelError } from "../../../documents/certificate/content";
import { fuelErrorCurve } from "../../../metrology";
import type { CycleFigures } from "../../../metrology/cycle/types";

const steps = 48;

/** Over the measured widths only, closer together where the pulses are short and the error grows. */
export function fuelErrorOf(figures: CycleFigures): FuelError {
  const withLine = figures.injectors.flatMap(({ injectorId, flowLine }) =>
    flowLine ? [{ injectorId, flowLine }] : [],
  );
  const measured = figures.injectors.flatMap((injector) => injector.flows.map((flow) => flow.pulseWidthMs));
  if (withLine.length < 2) return { pulseWidthsMs: [], injectors: [] };
  const longestDeadTime = Math.max(...withLine.map(({ flowLine }) => flowLine.deadTimeMs));
  const from = Math.min(...measured.filter((width) => width > longestDeadTime));
  const pulseWidthsMs = geometricSteps(from, Math.max(...measured));
  return { pulseWidthsMs, injectors: curves(withLine, pulseWidthsMs) };
}
