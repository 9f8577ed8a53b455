import "server-only";
import { dataNumber } from "../../format/format-number";
import type { Quantity } from "../../format/quantities";
import type { CertificateContent, CertifiedInjector, CertifiedPhase } from "../certificate/content";
import {
  checksOf,
  deadTimeOf,
  figuresOf,
  flowAt,
  measuredWidths,
  phaseNames,
  phasesOf,
} from "../certificate/reading-content";

/** A figure under its name, which carries the unit. Null where there is none. */
export type DataFigure = { name: string; value: string | null };

export type DataRow = {
  phase: (typeof phaseNames)[number];
  injector: CertifiedInjector;
  figures: DataFigure[];
};

/** Everything a controller or a spreadsheet wants of each injector, as found and as left, in the certificate's digits. */
export function dataSheetRows(content: CertificateContent): DataRow[] {
  const widths = measuredWidths(content);
  return phasesOf(content).flatMap((phase, index) =>
    content.injectors
      .filter(({ injectorId }) => figuresOf(phase, injectorId))
      .map((injector) => ({
        phase: phaseNames[index]!,
        injector,
        figures: figuresOfInjector(phase, injector.injectorId, widths),
      })),
  );
}

function figuresOfInjector(phase: CertifiedPhase, injectorId: string, widths: number[]): DataFigure[] {
  const figures = figuresOf(phase, injectorId);
  const deadTime = deadTimeOf(figures?.flowLine);
  const range = figures?.flowLine?.linearRange;
  const checks = checksOf(phase, injectorId);
  return [
    figure("static_flow_ml_per_min", figures?.staticFlow?.value, "staticFlow"),
    figure(
      "static_flow_expanded_uncertainty_ml_per_min",
      figures?.staticFlow?.expandedUncertainty,
      "staticFlow",
    ),
    figure("dead_time_ms", deadTime?.value, "deadTime"),
    figure("dead_time_low_ms", deadTime?.low, "deadTime"),
    figure("dead_time_high_ms", deadTime?.high, "deadTime"),
    figure("dead_time_at_drive_v", phase.driveVolts.value, "voltage"),
    figure("linear_from_ms", range?.fromMs, "pulseWidth"),
    figure("linear_to_ms", range?.toMs, "pulseWidth"),
    figure("held_open_ml_per_min", figures?.heldOpen?.mlPerMin, "staticFlow"),
    figure("resistance_at_20_c_ohm", checks?.resistance?.ohmsAt20C, "resistance"),
    figure("leakage_mm3_per_min", checks?.leakage?.mm3PerMin, "leakage"),
    ...widths.map((width) =>
      figure(`flow_at_${width}_ms_ul`, flowAt(phase, injectorId, width)?.volumePerPulseUl, "flowPerPulse"),
    ),
    ...widths.map((width) => figure(`adder_at_${width}_ms_ms`, adderAt(phase, injectorId, width), "adder")),
  ];
}

function figure(name: string, value: number | null | undefined, quantity: Quantity): DataFigure {
  return { name, value: dataNumber(value, quantity) || null };
}

/** Adders are named by the timer's true widths; the nearest width that was set is meant. */
function adderAt({ shortPulseAdders }: CertifiedPhase, injectorId: string, width: number): number | null {
  const found = shortPulseAdders.find(
    (adder) => adder.injectorId === injectorId && Math.abs(adder.pulseWidthMs - width) < 0.02 * width,
  );
  return found?.adderMs ?? null;
}
