import { requireNumber } from "../limits";
import { type DeadTimeRow, deadTimeTable } from "./dead-time-table";
import { monotoneCubic } from "./monotone-cubic";

/**
 * Dead time at a drive voltage between measured ones, by monotone cubic; never beyond the table.
 *
 * Units: V in, ms out. Range: from the lowest to the highest voltage of the table (as `deadTimeTable` makes it).
 * Throws RangeError for an empty table or volts outside it, naming the limits.
 * Source: F. N. Fritsch and R. E. Carlson, SIAM J. Numer. Anal. 17 (1980) 238-246.
 */
export function deadTimeAt(
  table: readonly Pick<DeadTimeRow, "volts" | "deadTimeMs">[],
  volts: number,
): number {
  const rows = deadTimeTable(table);
  const [lowest, highest] = [rows[0], rows.at(-1)];
  if (!lowest || !highest) throw new RangeError("table must have at least 1 voltage: none was given");
  requireNumber("volts", volts, { from: lowest.volts, upTo: highest.volts });
  return monotoneCubic(
    rows.map((row) => row.volts),
    rows.map((row) => row.deadTimeMs),
  )(volts);
}
