import type { CertifiedPhase, PresentedResults } from "@/data/certificates";
import { FlowLineChart } from "@/ui/chart/flow-line-chart";
import type { FlowSeries } from "@/ui/chart/flow-series";
import { FuelErrorChart } from "@/ui/chart/fuel-error-chart";
import { Sheet } from "@/ui/layout/sheet";
import { placeOf } from "./injector-name";
import { halfLimitOf } from "./result-rows";

/** The flow lines, and what they mean for the fuel at every pulse width. */
export function Pictures({ results }: { results: PresentedResults }) {
  const { asFound, asLeft } = results;
  const left = asLeft ?? asFound;
  if (!left) return null;
  const label = labelsOf(results);
  const found = asLeft ? asFound : null;
  return (
    <div className="grid gap-3.5 laptop:grid-cols-2">
      <Sheet
        title="Flow line"
        note={`µL per pulse against pulse width${found ? ", as found pale" : ", as found"}`}
      >
        <FlowLineChart left={seriesOf(left, label)} found={found ? seriesOf(found, label) : []} />
      </Sheet>
      <Sheet
        title="Fuel error"
        note={`each injector against the set, by pulse width, ${asLeft ? "as left" : "as found"}`}
      >
        {left.fuelError.injectors.length > 0 ? (
          <FuelErrorChart
            widthsMs={left.fuelError.pulseWidthsMs}
            series={left.fuelError.injectors.map(({ injectorId, errorPercent }) => ({
              key: injectorId,
              label: label(injectorId),
              left: errorPercent,
            }))}
            halfLimitPercent={halfLimitOf(results)}
          />
        ) : (
          <p className="text-ink-2">It takes two injectors with a flow line.</p>
        )}
      </Sheet>
    </div>
  );
}

function labelsOf({ injectors }: PresentedResults): (injectorId: string) => string {
  const labels = new Map(injectors.map(({ injectorId, tag }) => [injectorId, placeOf(tag)]));
  return (injectorId) => labels.get(injectorId) ?? "?";
}

function seriesOf({ figures }: CertifiedPhase, label: (injectorId: string) => string): FlowSeries[] {
  return figures.injectors.map(({ injectorId, flowLine, flows }) => ({
    key: injectorId,
    label: label(injectorId),
    fit: flowLine,
    points: flowLine?.points ?? flows.map((flow) => ({ ...flow, inLinearRange: false })),
  }));
}
