import { requireNumber } from "../limits";

export type DeadTimeRow = { volts: number; deadTimeMs: number; deadTimeSeMs: number | null };

type Cycle = Omit<DeadTimeRow, "deadTimeSeMs"> & Partial<DeadTimeRow>;

/**
 * Dead time of one injector by drive voltage, in rising order, from cycles run at different voltages. A cycle is its
 * drive voltage together with what its flow line says of the dead time.
 *
 * Units: V, ms. Range: volts above 0, each only once: which of two cycles at one voltage counts is the caller's to say.
 * Throws RangeError naming volts, deadTimeMs or deadTimeSeMs, or for a voltage given twice.
 * Source: none needed; the dead times are x-intercepts, see `fitFlowLine`.
 */
export function deadTimeTable(cycles: readonly Cycle[]): DeadTimeRow[] {
  const rows = cycles.map(({ volts, deadTimeMs, deadTimeSeMs = null }, index) => {
    requireNumber(`cycles[${index}].volts`, volts, { above: 0 });
    requireNumber(`cycles[${index}].deadTimeMs`, deadTimeMs);
    if (deadTimeSeMs !== null) requireNumber(`cycles[${index}].deadTimeSeMs`, deadTimeSeMs, { from: 0 });
    return { volts, deadTimeMs, deadTimeSeMs };
  });
  rows.sort((a, b) => a.volts - b.volts);
  const twice = rows.find((row, index) => row.volts === rows[index + 1]?.volts);
  if (twice) throw new RangeError(`cycles must differ in volts: ${twice.volts} was given twice`);
  return rows;
}
