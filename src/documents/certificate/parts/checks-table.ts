import "server-only";
import { formatNumber, formatQuantity, formatWithUncertainty, noFigure } from "../../../format/format-number";
import { foundAndLeft } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { Row } from "../../drawing/table-spec";
import type { CertificateContent, CertifiedChecks, CertifiedInjector } from "../content";
import { checksOf, phasesOf } from "../reading-content";
import { injectorCell } from "./flow-table";

const columns: { title: string[]; write: (checks: CertifiedChecks) => string }[] = [
  {
    title: ["Resistance", "Ω at 20 °C"],
    write: ({ resistance }) =>
      formatWithUncertainty(resistance?.ohmsAt20C, resistance?.expandedUncertainty, "resistance"),
  },
  { title: ["In the", "model's band"], write: ({ resistance }) => resistance?.bandVerdict ?? noFigure },
  {
    title: ["Insulation", "MΩ"],
    write: ({ insulationMegohm }) => formatNumber(insulationMegohm, "insulation"),
  },
  { title: ["Leakage", "mm³/min"], write: ({ leakage }) => formatNumber(leakage?.mm3PerMin, "leakage") },
  { title: ["at", "kPa"], write: ({ leakage }) => formatNumber(leakage?.pressureKpa, "pressure") },
  { title: ["for", "s"], write: ({ leakage }) => formatNumber(leakage?.seconds, "openTime") },
  { title: ["Spray", "grade"], write: ({ sprayGrade }) => sprayGrade ?? noFigure },
  {
    title: ["Channel"],
    write: ({ channelNumber, load }) => (load > 1 ? `${channelNumber}, load ${load}` : String(channelNumber)),
  },
];

/** Winding, leakage and spray of every injector; what was not checked is a dash. */
export function checksTable(pen: Pen, content: CertificateContent, width: number): Section[] {
  const { resistanceLowOhm, resistanceHighOhm, leakageLimitMm3PerMin, leakagePressureKpa } = content.model;
  const band = `${formatNumber(resistanceLowOhm, "resistance")} to ${formatQuantity(resistanceHighOhm, "resistance")}`;
  const limit = `${formatQuantity(leakageLimitMm3PerMin, "leakage")} at ${formatQuantity(leakagePressureKpa, "pressure")}`;
  return tableSections(
    pen,
    { title: "Winding, leakage and spray", note: `model's band ${band}; model's leakage limit ${limit}` },
    {
      columns: [
        { title: ["Injector"], align: "left" },
        ...columns.map(({ title }) => ({ title, align: "right" as const })),
      ],
      rows: content.injectors.map((injector) => rowOf(content, injector)),
    },
    width,
  );
}

function rowOf(content: CertificateContent, injector: CertifiedInjector): Row {
  const [found, left] = phasesOf(content).map((phase) => checksOf(phase, injector.injectorId));
  const cells = columns.map(({ write }) =>
    foundAndLeft(found ? write(found) : noFigure, left ? write(left) : noFigure),
  );
  return { cells: [injectorCell(injector), ...cells] };
}
