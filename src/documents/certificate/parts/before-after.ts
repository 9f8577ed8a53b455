import "server-only";
import { formatNumber, formatQuantity } from "../../../format/format-number";
import { type Quantity, unitOf } from "../../../format/quantities";
import { type Block, beside, stack } from "../../drawing/block";
import { figure, quietWords, words } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import { railStripBlock } from "../../drawing/rail-strip";
import { table } from "../../drawing/table";
import type { TableSpec } from "../../drawing/table-spec";
import { heading } from "../../drawing/text-blocks";
import type { CertificateContent, CertifiedPhase } from "../content";
import { figuresOf, phasesOf, placeOf } from "../reading-content";

/** More injectors than this need the whole width for their strip. */
const mostBeside = 16;

/** The rail strip with what the work changed, in figures. */
export function beforeAndAfter(pen: Pen, content: CertificateContent, width: number): Block {
  const wide = content.injectors.length > mostBeside;
  const stripWidth = wide ? width : width * 0.6;
  const tableWidth = wide ? width : width - stripWidth - 18;
  const strip = railStripOf(pen, content, stripWidth);
  const change = changeTable(pen, content, tableWidth, wide);
  return wide
    ? stack([strip, change], 10)
    : beside([
        { at: 0, block: strip },
        { at: stripWidth + 18, block: change },
      ]);
}

function railStripOf(pen: Pen, content: CertificateContent, width: number): Block {
  const { staticSpreadPercent } = content.toleranceClass;
  const half = staticSpreadPercent === null ? null : staticSpreadPercent / 2;
  const limits = half === null ? "" : `, hairlines ±${formatQuantity(half, "tolerance")}`;
  const [found, left] = phasesOf(content).map((phase) => deviationsOf(content, phase));
  return stack([
    heading(
      pen,
      "Rail strip",
      `static flow against the set's mean, as found pale behind as left${limits}`,
      width,
    ),
    railStripBlock(pen, {
      found,
      left,
      labels: content.injectors.map(placeOf),
      halfLimitPercent: half,
      width,
      height: 98,
    }),
  ]);
}

function deviationsOf({ injectors }: CertificateContent, phase: CertifiedPhase): (number | null)[] {
  const mean = phase.figures.staticSpread?.mean;
  return injectors.map(({ injectorId }) => {
    const value = figuresOf(phase, injectorId)?.staticFlow?.value;
    return mean === undefined || value === undefined ? null : (100 * (value - mean)) / mean;
  });
}

const changes: {
  name: readonly [string, string];
  quantity: Quantity;
  of: (phase: CertifiedPhase) => number | null;
}[] = [
  { name: ["Static flow,", "mean"], quantity: "staticFlow", of: meanStaticFlow },
  {
    name: ["Spread of", "static flow"],
    quantity: "spread",
    of: ({ figures }) => figures.staticSpread?.spreadPercent ?? null,
  },
  { name: ["Widest spread", "at a pulse width"], quantity: "spread", of: widestSpread },
  {
    name: ["Range of", "dead times"],
    quantity: "deadTime",
    of: ({ figures }) => figures.deadTimeRange?.rangeMs ?? null,
  },
  { name: ["Range of", "resistances"], quantity: "resistance", of: resistanceRange },
];

/** Beside a narrow strip the figures stand below each other, below a wide one side by side. */
function changeTable(pen: Pen, content: CertificateContent, width: number, wide: boolean): Block {
  const { head, rows } = table(pen, wide ? changesInColumns(content) : changesInRows(content), width);
  return stack([head, ...rows]);
}

function changesInRows(content: CertificateContent): TableSpec {
  return {
    columns: [
      { title: ["The set"], align: "left" },
      { title: ["as found"], align: "right" },
      { title: ["as left"], align: "right" },
    ],
    rows: changes.map(({ name, quantity, of }) => {
      const [found, left] = phasesOf(content).map((phase) => formatNumber(of(phase), quantity));
      return { cells: [words(`${name.join(" ")}, ${unitOf(quantity)}`), quietWords(found!), figure(left!)] };
    }),
  };
}

function changesInColumns(content: CertificateContent): TableSpec {
  const [found, left] = phasesOf(content).map((phase) =>
    changes.map(({ quantity, of }) => formatNumber(of(phase), quantity)),
  );
  return {
    columns: [
      { title: ["The set"], align: "left" },
      ...changes.map(({ name: [first, second], quantity }) => ({
        title: [first, `${second}, ${unitOf(quantity)}`],
        align: "right" as const,
      })),
    ],
    rows: [
      { cells: [quietWords("as found"), ...found!.map(quietWords)] },
      { cells: [words("as left"), ...left!.map(figure)] },
    ],
  };
}

function meanStaticFlow({ figures }: CertifiedPhase): number | null {
  const only = figures.injectors.length === 1 ? figures.injectors[0]!.staticFlow?.value : undefined;
  return figures.staticSpread?.mean ?? only ?? null;
}

function widestSpread({ figures }: CertifiedPhase): number | null {
  const spreads = figures.widths.flatMap(({ spread }) => (spread ? [spread.spreadPercent] : []));
  return spreads.length > 0 ? Math.max(...spreads) : null;
}

function resistanceRange({ checks }: CertifiedPhase): number | null {
  const ohms = checks.flatMap(({ resistance }) => (resistance ? [resistance.ohmsAt20C] : []));
  return ohms.length > 1 ? Math.max(...ohms) - Math.min(...ohms) : null;
}
