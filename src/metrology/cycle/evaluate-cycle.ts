import { rangeInterval } from "../line/range-interval";
import type { DrawOptions } from "../uncertainty/drawn-interval";
import { convertConditions } from "./convert-conditions";
import { figuresOfInjector, type InjectorResult } from "./figures-of-injector";
import { spreadOfSet } from "./spread-of-set";
import type { CycleFigures, CycleInput, InjectorFigures } from "./types";

/**
 * Everything that follows from the readings of one cycle: true volumes by each channel's gain and offset, flows per pulse
 * and held open at reference density and (where `correctFlow` allows) pressure, means of repeats, each injector's flow line
 * with dead time, closure and static flow with its expanded uncertainty, and the set's spreads and dead-time range.
 *
 * Intervals of spreads and of the range rest on what is each injector's own (resolution, repeatability, the channel's gain
 * and offset) and are drawn with a fixed seed: the same input gives the same figures. `draws` trades their last digits
 * for speed. An injector whose readings cannot be used does not harm the others: its `lineProblem` says why.
 * The static flow of a line measured away from the reference pressure is brought there by the root law, the flows are not.
 *
 * Units: as in `CycleInput`; results mL/min, µL per pulse, ms, %. Range: conditions as `fluidDensity` and `correctFlow` take them.
 * Throws RangeError naming the condition, the reference or `draws`, never for readings.
 * Sources: JCGM 100:2008 and JCGM 101:2008; the parts name theirs.
 */
export function evaluateCycle(input: CycleInput, { draws = 4000 }: { draws?: number } = {}): CycleFigures {
  const conversion = convertConditions(input.conditions, input.reference);
  const results = input.injectors.map((injector) =>
    figuresOfInjector(injector, { conditions: input.conditions, conversion }),
  );
  const injectors = results.map(({ figures }) => figures);
  const options = { draws, seed: 1 };
  return {
    densityGPerMl: conversion.densityGPerMl,
    correction: conversion.correction,
    injectors,
    widths: commonWidths(injectors).map((pulseWidthMs) => ({
      pulseWidthMs,
      spread: spreadOfSet(
        injectors.map((injector) => flowAt(injector, pulseWidthMs)),
        options,
      ),
    })),
    staticSpread: spreadOfSet(injectors.map(staticOf), options),
    heldOpenSpread: spreadOfSet(injectors.map(heldOpenOf), options),
    deadTimeRange: deadTimeRange(results, options),
  };
}

/** Pulse widths below 100 % duty that every injector has, in rising order. */
function commonWidths(injectors: readonly InjectorFigures[]): number[] {
  const [first, ...others] = injectors.map(
    ({ flows }) => new Set(flows.filter((flow) => flow.dutyPercent < 100).map((flow) => flow.pulseWidthMs)),
  );
  return [...(first ?? [])]
    .filter((width) => others.every((widths) => widths.has(width)))
    .sort((a, b) => a - b);
}

function flowAt({ flows }: InjectorFigures, pulseWidthMs: number) {
  const flow = flows.find((candidate) => candidate.pulseWidthMs === pulseWidthMs);
  return flow ? { value: flow.volumePerPulseUl, u: flow.ownU } : null;
}

function staticOf({ staticFlow, staticFlowOwnU }: InjectorFigures) {
  return staticFlow && staticFlowOwnU !== null ? { value: staticFlow.value, u: staticFlowOwnU } : null;
}

function heldOpenOf({ heldOpen }: InjectorFigures) {
  return heldOpen && { value: heldOpen.mlPerMin, u: heldOpen.ownU };
}

function deadTimeRange(
  results: readonly InjectorResult[],
  options: DrawOptions,
): CycleFigures["deadTimeRange"] {
  const known = results.flatMap(({ figures, deadTimeOwnU }) =>
    figures.flowLine && deadTimeOwnU !== null
      ? [{ value: figures.flowLine.deadTimeMs, u: deadTimeOwnU }]
      : [],
  );
  if (known.length < 2 || known.length < results.length) return null;
  const values = known.map(({ value }) => value);
  const { low, high } = rangeInterval(
    values,
    known.map(({ u }) => u),
    options,
  );
  return { rangeMs: Math.max(...values) - Math.min(...values), expandedUncertainty: (high - low) / 2 };
}
