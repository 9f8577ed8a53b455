import type { CertifiedPhase } from "../../../documents/certificate/content";
import type { CycleFigures } from "../../../metrology/cycle/types";

/** A cycle is run at one drive voltage, so this holds one dead time per injector, at the voltage it was measured at. */
export function deadTimesByVoltage(
  figures: CycleFigures,
  volts: number,
): CertifiedPhase["deadTimesByVoltage"] {
  return figures.injectors.flatMap(({ injectorId, flowLine }) =>
    flowLine
      ? [{ injectorId, volts, deadTimeMs: flowLine.deadTimeMs, deadTimeSeMs: flowLine.deadTimeSeMs }]
      : [],
  );
}
