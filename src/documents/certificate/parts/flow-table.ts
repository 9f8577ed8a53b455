import "server-only";
import { formatNumber, formatUncertainty, noFigure } from "../../../format/format-number";
import { unitOf } from "../../../format/quantities";
import type { CycleFigures, SpreadWithInterval } from "../../../metrology/cycle/types";
import { foundAndLeft, quietWords, words } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import { styles } from "../../drawing/print-style";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { Cell, Column, Row } from "../../drawing/table-spec";
import type { CertificateContent, CertifiedInjector, CertifiedPhase } from "../content";
import { figuresOf, flowAt, measuredWidths, phasesOf } from "../reading-content";

/** Coverage factor for what is stated of a single flow per pulse. */
const coverageFactor = 2;

/** Every injector as found and as left at every pulse width, and its static flow. */
export function flowTable(pen: Pen, content: CertificateContent, width: number): Section[] {
  const widths = measuredWidths(content);
  const columns: Column[] = [
    { title: ["Injector"], align: "left" },
    ...widths.map((value): Column => {
      const title = `${formatNumber(value, "pulseWidth")} ${unitOf("pulseWidth")}`;
      return { title: [title, unitOf("flowPerPulse")], align: "right", even: true };
    }),
    { title: ["Static flow", unitOf("staticFlow")], align: "right" },
  ];
  const rows: Row[] = [
    ...content.injectors.map((injector) => injectorRow(content, injector, widths)),
    ...summaryRows(content, widths),
  ];
  return tableSections(
    pen,
    {
      title: "Flow per pulse",
      note: "as found above, as left below in strong type; at the reference conditions",
    },
    { columns, rows },
    width,
  );
}

export function injectorCell({ tag, serial, marking }: CertifiedInjector): Cell {
  const name = serial ?? marking;
  const lines = [{ text: tag, style: styles.bodyStrong }];
  return name === "" ? lines : [...lines, { text: name, style: styles.small }];
}

function injectorRow(content: CertificateContent, injector: CertifiedInjector, widths: number[]): Row {
  const pair = (write: (phase: CertifiedPhase) => string) => {
    const [found, left] = phasesOf(content).map(write);
    return foundAndLeft(found!, left!);
  };
  const { injectorId } = injector;
  return {
    cells: [
      injectorCell(injector),
      ...widths.map((value) =>
        pair((phase) => formatNumber(flowAt(phase, injectorId, value)?.volumePerPulseUl, "flowPerPulse")),
      ),
      pair((phase) => formatNumber(figuresOf(phase, injectorId)?.staticFlow?.value, "staticFlow")),
    ],
  };
}

function summaryRows(content: CertificateContent, widths: number[]): Row[] {
  const ofSpreads = (name: string, write: (spread: SpreadWithInterval) => string, rule?: "strong"): Row => ({
    rule,
    cells: [
      words(name),
      ...widths.map((value) => spreadPair(content, (figures) => spreadAt(figures, value), write)),
      spreadPair(content, ({ staticSpread }) => staticSpread, write),
    ],
  });
  return [
    ofSpreads("Spread, %", ({ spreadPercent }) => formatNumber(spreadPercent, "spread"), "strong"),
    ofSpreads("± of the spread, %", ({ expandedUncertainty }) =>
      formatUncertainty(expandedUncertainty, "spread"),
    ),
    {
      cells: [
        words(`± of a flow, µL, k = ${coverageFactor}`),
        ...widths.map((value) => ownUncertainty(content, value)),
        quietWords(""),
      ],
    },
  ];
}

function spreadAt({ widths }: CycleFigures, pulseWidthMs: number): SpreadWithInterval | null {
  return widths.find((width) => width.pulseWidthMs === pulseWidthMs)?.spread ?? null;
}

function spreadPair(
  content: CertificateContent,
  pick: (figures: CycleFigures) => SpreadWithInterval | null,
  write: (spread: SpreadWithInterval) => string,
): Cell {
  const [found, left] = phasesOf(content).map(({ figures }) => {
    const spread = pick(figures);
    return spread ? write(spread) : noFigure;
  });
  return foundAndLeft(found!, left!);
}

/** The largest of the set: what is an injector's own, resolution, repeatability and its channel's calibration. */
function ownUncertainty(content: CertificateContent, pulseWidthMs: number): Cell {
  const [found, left] = phasesOf(content).map(({ figures }) => {
    const own = figures.injectors.flatMap(({ flows }) =>
      flows.filter((flow) => flow.pulseWidthMs === pulseWidthMs).map(({ ownU }) => ownU),
    );
    return own.length > 0 ? formatUncertainty(coverageFactor * Math.max(...own), "flowPerPulse") : noFigure;
  });
  return foundAndLeft(found!, left!);
}
