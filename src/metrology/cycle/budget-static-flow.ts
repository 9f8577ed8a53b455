import { fluidExpansion } from "../fluids/fluid-expansion";
import { combineUncertainty, type UncertaintyComponent } from "../uncertainty/combine-uncertainty";
import { tFactor } from "../uncertainty/t-factor";
import type { InjectorLine } from "./fit-injector-line";
import type { OwnParts } from "./own-parts-of-line";
import type { CycleConditions, ValueWithU } from "./types";

type Budget = {
  line: InjectorLine;
  own: OwnParts;
  conditions: CycleConditions;
  /** From µL/ms at the line's pressure to mL/min at the reference pressure. */
  factor: number;
};

/**
 * Static flow of a line, 60 · slope, at reference conditions with its expanded uncertainty at 95 %.
 *
 * Own parts: the line, the channel's gain and offset. Shared parts: pressure (half its share, by the root law), fluid
 * temperature (half the fluid's expansion), pulse timer (its share of the middle width). Not in it, since no record
 * states them: the density of the fluid itself and the injector's own drift.
 */
export function budgetStaticFlow({ line, own, conditions, factor }: Budget): ValueWithU {
  const { flowLine } = line;
  const value = flowLine.slopeUlPerMs * factor;
  const { pressureKpa, fluid, fluidTemperatureC, shared } = conditions;
  const { fromMs, toMs } = flowLine.linearRange;
  const part = (name: string, standardUncertainty: number, sensitivity: number) => ({
    name,
    standardUncertainty,
    sensitivity,
  });
  const { expandedUncertainty, coverageFactor } = combineUncertainty([
    { ...lineComponent(line, own.reading), sensitivity: factor },
    part("channel gain", own.gain, factor),
    part("channel offset", own.offset, factor),
    part("rail pressure", shared.pressureKpa, value / 2 / pressureKpa),
    part(
      "fluid temperature",
      shared.fluidTemperatureC,
      (value * fluidExpansion(fluid, fluidTemperatureC)) / 2,
    ),
    part("pulse timer", shared.pulseWidthMs, (2 * value) / (fromMs + toMs)),
  ]);
  return { value, expandedUncertainty, coverageFactor };
}

/**
 * Scatter about the line with its few degrees of freedom, or what resolution and repeatability explain, whichever
 * expands to more: points that happen to lie on a line do not make it more certain than its readings.
 */
function lineComponent({ flowLine, scatterSe }: InjectorLine, explained: number): UncertaintyComponent {
  const name = "flow line";
  const { degreesOfFreedom } = flowLine.line;
  if (tFactor(0.95, degreesOfFreedom) * scatterSe > tFactor(0.95, Number.POSITIVE_INFINITY) * explained)
    return { name, standardUncertainty: scatterSe, degreesOfFreedom };
  return { name, standardUncertainty: explained };
}
