import { type FlowLine, fitFlowLine } from "../line/fit-flow-line";
import type { FlowPoint } from "../line/flow-point";
import type { PulseFlow } from "./convert-reading";

/** `scatterSe`: standard error of the slope from the scatter about the line, weighted or not. */
export type InjectorLine = { flowLine: FlowLine; scatterSe: number };

/**
 * The flow line of one injector from all its readings below 100 % duty. Points are weighted when pulse counts differ: by
 * resolution and repeatability, not by the channel's gain, which all points of an injector share.
 * @returns the line, or a sentence that says why there is none.
 */
export function fitInjectorLine(flows: readonly PulseFlow[]): InjectorLine | { problem: string } {
  const pulsed = flows.filter((flow) => flow.dutyPercent < 100);
  const widths = new Set(pulsed.map((flow) => flow.pulseWidthMs)).size;
  if (flows.length === 0) return { problem: "It has no reading at a pulse width yet." };
  if (pulsed.length === 0)
    return { problem: "Every pulse is as long as the period or longer: the injector never closes." };
  if (widths < 3) return { problem: `A line needs 3 pulse widths: there ${countOf(widths)}.` };
  try {
    const points = withWeights(pulsed);
    const flowLine = fitFlowLine(points);
    const { slopeSe, residualSd } = flowLine.line;
    const isWeighted = points.some((point) => point.u !== undefined);
    return { flowLine, scatterSe: (slopeSe ?? 0) * (isWeighted ? (residualSd ?? 1) : 1) };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return { problem: "No 3 neighbouring pulse widths lie within ±5 % of a rising line." };
  }
}

function countOf(widths: number): string {
  return widths === 1 ? "is 1" : `are ${widths}`;
}

function withWeights(flows: readonly PulseFlow[]): FlowPoint[] {
  const differ = new Set(flows.map((flow) => flow.pulseCount)).size > 1;
  return flows.map(({ pulseWidthMs, flow, resolution, repeatability }) => {
    const u = Math.hypot(resolution, repeatability);
    const point = { pulseWidthMs, volumePerPulseUl: flow };
    return differ && u > 0 ? { ...point, u } : point;
  });
}
