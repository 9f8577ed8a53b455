import { budgetStaticFlow } from "./budget-static-flow";
import type { Conversion } from "./convert-conditions";
import { convertInjector } from "./convert-injector";
import { fitInjectorLine, type InjectorLine } from "./fit-injector-line";
import { flowsByWidth } from "./flows-by-width";
import { meanFlow } from "./mean-flow";
import { type OwnParts, ownPartsOfLine } from "./own-parts-of-line";
import type { CycleConditions, CycleInjector, InjectorFigures } from "./types";

/** `deadTimeOwnU`: own standard uncertainty of the dead time, for the range of the set. */
export type InjectorResult = { figures: InjectorFigures; deadTimeOwnU: number | null };

type Beside = { conditions: CycleConditions; conversion: Conversion };

/** Never throws for bad readings: a sentence in `lineProblem` says what is wrong with them. */
export function figuresOfInjector(injector: CycleInjector, beside: Beside): InjectorResult {
  try {
    return evaluate(injector, beside);
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    const problem = `A reading cannot be computed with: ${error.message}.`;
    return { figures: withoutLine(injector.injectorId, problem), deadTimeOwnU: null };
  }
}

function evaluate(injector: CycleInjector, beside: Beside): InjectorResult {
  const { injectorId, channel } = injector;
  const { pulses, held } = convertInjector(injector, beside);
  const mean = held.length > 0 ? meanFlow(held, channel.calibration) : null;
  const heldOpen = mean && { mlPerMin: mean.flow, ownU: mean.ownU };
  const line = fitInjectorLine(pulses);
  const measured = { flows: flowsByWidth(pulses, channel.calibration), heldOpen };
  if ("problem" in line)
    return { figures: { ...withoutLine(injectorId, line.problem), ...measured }, deadTimeOwnU: null };
  const own = ownPartsOfLine(pulses, line.flowLine, channel.calibration);
  return {
    figures: { injectorId, ...measured, ...figuresOfLine(line, own.slope, heldOpen, beside) },
    deadTimeOwnU: total(own.deadTime),
  };
}

function figuresOfLine(
  line: InjectorLine,
  own: OwnParts,
  heldOpen: InjectorFigures["heldOpen"],
  { conditions, conversion: { correction } }: Beside,
) {
  // The slope follows the root law from any pressure, though readings further than 3 % off stand at their own.
  const factor = (60 * correction.pressureStatic) / correction.pressureDynamic;
  const staticFlow = budgetStaticFlow({ line, own, conditions, factor });
  return {
    flowLine: line.flowLine,
    lineProblem: null,
    staticFlow,
    staticFlowOwnU: factor * total(own),
    closurePercent: closure(staticFlow.value, heldOpen?.mlPerMin ?? 0),
  };
}

function total({ reading, gain, offset }: OwnParts): number {
  return Math.hypot(reading, gain, offset);
}

function closure(ofLine: number, heldOpen: number): number | null {
  const percent = (100 * (ofLine - heldOpen)) / heldOpen;
  return heldOpen > 0 && Number.isFinite(percent) ? percent : null;
}

function withoutLine(injectorId: string, lineProblem: string): InjectorFigures {
  return {
    injectorId,
    flows: [],
    heldOpen: null,
    flowLine: null,
    lineProblem,
    staticFlow: null,
    staticFlowOwnU: null,
    closurePercent: null,
  };
}
