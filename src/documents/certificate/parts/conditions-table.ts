import "server-only";
import { formatRecordInstant } from "../../../format/format-date";
import { formatNumber, formatQuantity, formatWithUncertainty } from "../../../format/format-number";
import { plural } from "../../../format/plural";
import type { Quantity } from "../../../format/quantities";
import { words } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import { styles } from "../../drawing/print-style";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { CertificateContent, CertifiedCondition, CertifiedPhase } from "../content";
import { phasesOf } from "../reading-content";

type Line = { name: string; write: (phase: CertifiedPhase, content: CertificateContent) => string };

const lines: Line[] = [
  { name: "Measured", write: ({ measuredAt }, { lab }) => formatRecordInstant(measuredAt, lab.timeZone) },
  { name: "Record", write: ({ cycleNumber, revision }) => `cycle ${cycleNumber}, revision ${revision}` },
  {
    name: "Bench",
    write: ({ bench }) => [bench.code, bench.location].filter((part) => part !== "").join(", "),
  },
  { name: "Fluid", write: ({ fluid }) => fluid },
  {
    name: "Fluid temperature",
    write: ({ fluidTemperatureC }) => condition(fluidTemperatureC, "temperature"),
  },
  {
    name: "Density at that temperature",
    write: ({ figures }) => formatQuantity(figures.densityGPerMl, "density"),
  },
  { name: "Pressure across the injector", write: ({ pressureKpa }) => condition(pressureKpa, "pressure") },
  { name: "Drive voltage", write: ({ driveVolts }) => condition(driveVolts, "voltage") },
  { name: "Driver", write: ({ driverKind }) => driverKind },
  { name: "Period", write: ({ periodMs }) => condition(periodMs, "period") },
  { name: "Pulses at each width", write: pulsesOf },
  {
    name: "Held open",
    write: ({ heldOpenSeconds }) =>
      heldOpenSeconds === null ? "not measured" : formatQuantity(heldOpenSeconds, "openTime"),
  },
  {
    name: "Factor to the reference density",
    write: ({ figures }) => formatNumber(figures.correction.density, "gain"),
  },
  {
    name: "Factor to the reference pressure",
    write: ({ figures: { correction } }) =>
      `static ${formatNumber(correction.pressureStatic, "gain")}, per pulse ${formatNumber(correction.pressureDynamic, "gain")}`,
  },
  { name: "Technician's note", write: ({ note }) => (note === "" ? "none" : note) },
];

/** What dead times and flows were measured at. A value is the true one by the instrument's calibration, ± at k = 2. */
export function conditionsTable(pen: Pen, content: CertificateContent, width: number): Section[] {
  return tableSections(
    pen,
    { title: "Conditions", note: "true values by the calibration of each instrument; ± with k = 2" },
    {
      columns: [
        { title: [""], align: "left" },
        { title: ["As found"], align: "left", flex: 1 },
        { title: ["As left"], align: "left", flex: 1 },
      ],
      rows: lines.map(({ name, write }) => ({
        cells: [
          [{ text: name, style: styles.found }],
          ...phasesOf(content).map((phase) => words(write(phase, content))),
        ],
      })),
    },
    width,
  );
}

function condition({ value, standardUncertainty }: CertifiedCondition, quantity: Quantity): string {
  return formatWithUncertainty(value, 2 * standardUncertainty, quantity, { unit: true });
}

function pulsesOf({ widths }: CertifiedPhase): string {
  const told = widths.map(({ pulseWidthMs, pulseCount, repeats }) => {
    const again = repeats > 1 ? ` (${plural(repeats, "time")})` : "";
    return `${pulseCount} at ${formatQuantity(pulseWidthMs, "pulseWidth")}${again}`;
  });
  return told.join(", ");
}
