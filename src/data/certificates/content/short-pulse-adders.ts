import type { CertifiedPhase } from "../../../documents/certificate/content";
import type { CycleFigures } from "../../../metrology/cycle/types";
import { shortPulseTable } from "../../../metrology/line/short-pulse-table";

/** Extra on-time below the linear range, injector by injector. */
export function shortPulseAdders(figures: CycleFigures): CertifiedPhase["shortPulseAdders"] {
  return figures.injectors.flatMap(({ injectorId, flowLine }) =>
    flowLine ? shortPulseTable(flowLine).map((entry) => ({ injectorId, ...entry })) : [],
  );
}
