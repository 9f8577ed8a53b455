import type { SheetInjector } from "../../../data/cycles/sheet/types";
import type { CycleFigures, InjectorFigures } from "../../../metrology/cycle/types";
import type { FlowSeries } from "../../../ui/chart/flow-series";

/** Static flow of each place against the mean of those that have one, in percent. */
export function deviations(injectors: SheetInjector[], figures: CycleFigures | null): (number | null)[] {
  const flows = injectors.map(
    ({ setInjectorId }) =>
      figures?.injectors.find((injector) => injector.injectorId === setInjectorId)?.staticFlow?.value ?? null,
  );
  const known = flows.filter((flow) => flow !== null);
  if (known.length < 2) return flows.map(() => null);
  const mean = known.reduce((sum, flow) => sum + flow, 0) / known.length;
  return flows.map((flow) => (flow === null ? null : (100 * (flow - mean)) / mean));
}

export function flowSeries(injectors: SheetInjector[], figures: CycleFigures | null): FlowSeries[] {
  return injectors.flatMap(({ setInjectorId, position }) => {
    const its = figures?.injectors.find((injector) => injector.injectorId === setInjectorId);
    if (!its || its.flows.length === 0) return [];
    return [seriesOf(setInjectorId, String(position), its)];
  });
}

function seriesOf(key: string, label: string, { flowLine, flows }: InjectorFigures): FlowSeries {
  if (!flowLine)
    return { key, label, fit: null, points: flows.map((flow) => ({ ...flow, inLinearRange: true })) };
  const { slopeUlPerMs, deadTimeMs, points } = flowLine;
  return { key, label, fit: { slopeUlPerMs, deadTimeMs }, points };
}
