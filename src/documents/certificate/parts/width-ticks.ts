import "server-only";
import { formatNumber, formatQuantity } from "../../../format/format-number";
import type { Tick } from "../../drawing/axes";

/** The last one carries the unit. */
export function widthTicks(widths: readonly number[]): Tick[] {
  return widths.map((value, index) => ({
    value,
    label: (index === widths.length - 1 ? formatQuantity : formatNumber)(value, "pulseWidth"),
  }));
}
