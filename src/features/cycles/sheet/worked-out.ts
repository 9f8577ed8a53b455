import type { Sheet } from "../../../data/cycles/sheet/types";
import { formatNumber } from "../../../format/format-number";
import type { CycleFigures } from "../../../metrology/cycle/types";

/** The grid's two lines at the foot: mean flow per pulse and spread of each column, by row and column id. */
export function workedOut(sheet: Sheet, figures: CycleFigures | null): Map<string, string> {
  const texts = new Map<string, string>();
  for (const column of sheet.columns) {
    const at = figures?.widths.find((width) => width.pulseWidthMs === column.pulseWidthMs)?.spread;
    const spread = column.heldOpen ? figures?.heldOpenSpread : at;
    if (!spread) continue;
    texts.set(
      `mean/${column.id}`,
      formatNumber(spread.mean, column.heldOpen ? "staticFlow" : "flowPerPulse"),
    );
    texts.set(`spread/${column.id}`, formatNumber(spread.spreadPercent, "spread"));
  }
  return texts;
}
