import { correctFlow } from "../fluids/correct-flow";
import { fluidDensity } from "../fluids/fluid-density";
import { requireNumber } from "../limits";
import type { CycleConditions, CycleFigures, FlowReference } from "./types";

/** What turns a true amount of this cycle into a flow at reference conditions. */
export type Conversion = Pick<CycleFigures, "densityGPerMl" | "correction"> & {
  /** mL in one unit of what is collected. */
  mlPerAmount: number;
  dynamicFactor: number;
  staticFactor: number;
};

/** @throws RangeError naming the condition that cannot be computed with. */
export function convertConditions(conditions: CycleConditions, reference: FlowReference): Conversion {
  const { fluid, fluidTemperatureC, collects, shared } = conditions;
  requireNumber("periodMs", conditions.periodMs, { above: 0 });
  requireNumber("repeatability", conditions.repeatability, { from: 0 });
  requireNumber("shared.pressureKpa", shared.pressureKpa, { from: 0 });
  requireNumber("shared.fluidTemperatureC", shared.fluidTemperatureC, { from: 0 });
  requireNumber("shared.pulseWidthMs", shared.pulseWidthMs, { from: 0 });
  const densityGPerMl = fluidDensity(fluid, fluidTemperatureC);
  const at = {
    basis: "volume" as const,
    pressureKpa: conditions.pressureKpa,
    referencePressureKpa: reference.pressureKpa,
    densityGPerMl,
    referenceDensityGPerMl: reference.densityGPerMl,
  };
  const held = correctFlow(1, { ...at, kind: "static" });
  const pulsed = correctFlow(1, { ...at, kind: "dynamic" });
  const density = correctFlow(1, { ...at, kind: "static", pressureKpa: reference.pressureKpa }).factor;
  return {
    densityGPerMl,
    correction: {
      density,
      pressureStatic: held.factor / density,
      pressureDynamic: pulsed.withinRange ? held.factor / density : 1,
      dynamicWithinRange: pulsed.withinRange,
    },
    mlPerAmount: collects === "mass" ? 1 / densityGPerMl : 1,
    dynamicFactor: pulsed.factor,
    staticFactor: held.factor,
  };
}
