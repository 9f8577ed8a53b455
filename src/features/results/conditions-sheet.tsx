import type { CertifiedPhase, PresentedResults } from "@/data/certificates";
import { formatRecordDayOf } from "@/format/format-date";
import { formatNumber, formatQuantity, formatWithUncertainty, noFigure } from "@/format/format-number";
import { type Fact, Facts } from "@/ui/layout/facts";
import { Sheet } from "@/ui/layout/sheet";

type Props = { results: PresentedResults; zone: string };

/** What the latest cycle was measured under, and the two figures that sum it up. */
export function ConditionsSheet({ results, zone }: Props) {
  const phase = results.asLeft ?? results.asFound;
  if (!phase) return null;
  return (
    <Sheet title="Conditions" note={results.asLeft ? "as left" : "as found"}>
      <Facts facts={[...conditions(phase, zone), ...summary(results)]} />
    </Sheet>
  );
}

function conditions(phase: CertifiedPhase, zone: string): Fact[] {
  const { bench, fluid, fluidTemperatureC, pressureKpa, driveVolts, driverKind, periodMs, figures } = phase;
  return [
    { label: "Bench", value: `${bench.code}, calibrated to ${calibratedTo(phase, zone)}` },
    {
      label: "Fluid",
      value: [
        fluid,
        formatQuantity(fluidTemperatureC.value, "temperature"),
        formatQuantity(figures.densityGPerMl, "density"),
      ].join(", "),
    },
    { label: "Pressure across", value: formatQuantity(pressureKpa.value, "pressure") },
    {
      label: "Drive",
      value: `${formatQuantity(driveVolts.value, "voltage")}, ${driverKind}, period ${formatQuantity(periodMs.value, "period")}`,
    },
  ];
}

/** The first day that one of the calibrations ends. */
function calibratedTo({ calibrations }: CertifiedPhase, zone: string): string {
  const first = calibrations.map((calibration) => calibration.validUntil).sort()[0];
  return formatRecordDayOf(first, zone);
}

function summary({ asFound, asLeft }: PresentedResults): Fact[] {
  const spreadOf = (phase: CertifiedPhase | null) =>
    formatNumber(phase?.figures.staticSpread?.spreadPercent, "spread");
  const latest = (asLeft ?? asFound)!.figures.staticSpread;
  const spread = asLeft ? `${spreadOf(asFound)} → ${spreadOf(asLeft)} %` : `${spreadOf(asFound)} %`;
  return [
    { label: "Static flow, mean", value: latest ? formatQuantity(latest.mean, "staticFlow") : noFigure },
    { label: "Spread", value: spread },
    {
      label: "Range of dead time",
      value: deadTimeRange((asLeft ?? asFound)!),
    },
  ];
}

function deadTimeRange({ figures: { deadTimeRange: range } }: CertifiedPhase): string {
  return formatWithUncertainty(range?.rangeMs, range?.expandedUncertainty, "deadTime", { unit: true });
}
