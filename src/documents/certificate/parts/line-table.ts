import "server-only";
import { formatNumber, formatWithUncertainty, noFigure } from "../../../format/format-number";
import { foundAndLeft } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { Row } from "../../drawing/table-spec";
import type { CertificateContent, CertifiedInjector, CertifiedPhase } from "../content";
import { deadTimeOf, figuresOf, phasesOf } from "../reading-content";
import { injectorCell } from "./flow-table";

type Write = (phase: CertifiedPhase, injectorId: string) => string;

const columns: { title: string[]; write: Write }[] = [
  {
    title: ["Static flow of the line", "mL/min"],
    write: (phase, id) => {
      const flow = figuresOf(phase, id)?.staticFlow;
      return formatWithUncertainty(flow?.value, flow?.expandedUncertainty, "staticFlow");
    },
  },
  {
    title: ["k"],
    write: (phase, id) => formatNumber(figuresOf(phase, id)?.staticFlow?.coverageFactor, "coverageFactor"),
  },
  {
    title: ["Held open", "mL/min"],
    write: (phase, id) => formatNumber(figuresOf(phase, id)?.heldOpen?.mlPerMin, "staticFlow"),
  },
  {
    title: ["Closure", "%"],
    write: (phase, id) => formatNumber(figuresOf(phase, id)?.closurePercent, "closure"),
  },
  {
    title: ["Dead time", "ms"],
    write: (phase, id) => formatNumber(deadTimeOf(figuresOf(phase, id)?.flowLine)?.value, "deadTime"),
  },
  { title: ["95 % interval", "ms"], write: intervalOf },
  { title: ["Linear range", "ms"], write: rangeOf },
  {
    title: ["Ratio"],
    write: (phase, id) => formatNumber(figuresOf(phase, id)?.flowLine?.linearRange.ratio, "ratio"),
  },
  {
    title: ["Degrees", "of freedom"],
    write: (phase, id) => {
      const degrees = figuresOf(phase, id)?.flowLine?.line.degreesOfFreedom;
      return degrees === undefined ? noFigure : String(degrees);
    },
  },
];

/** Static flow, dead time and linear range of every injector. */
export function lineTable(pen: Pen, content: CertificateContent, width: number): Section[] {
  const rows = content.injectors.map((injector) => rowOf(content, injector));
  return tableSections(
    pen,
    {
      title: "Static flow and dead time",
      note: "as found above, as left below; measured at the conditions stated",
    },
    {
      columns: [
        { title: ["Injector"], align: "left" },
        ...columns.map(({ title }) => ({ title, align: "right" as const })),
      ],
      rows,
    },
    width,
  );
}

function rowOf(content: CertificateContent, injector: CertifiedInjector): Row {
  const cells = columns.map(({ write }) => {
    const [found, left] = phasesOf(content).map((phase) => write(phase, injector.injectorId));
    return foundAndLeft(found!, left!);
  });
  return { cells: [injectorCell(injector), ...cells] };
}

function intervalOf(phase: CertifiedPhase, injectorId: string): string {
  const time = deadTimeOf(figuresOf(phase, injectorId)?.flowLine);
  return time ? `${formatNumber(time.low, "deadTime")} … ${formatNumber(time.high, "deadTime")}` : noFigure;
}

function rangeOf(phase: CertifiedPhase, injectorId: string): string {
  const range = figuresOf(phase, injectorId)?.flowLine?.linearRange;
  if (!range) return noFigure;
  return `${formatNumber(range.fromMs, "pulseWidth")} … ${formatNumber(range.toMs, "pulseWidth")}`;
}
