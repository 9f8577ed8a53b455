import "server-only";
import type { Pen } from "./pen";
import { usualSetting } from "./table";
import { leastWidth, naturalWidths, type Setting } from "./table-columns";
import type { TableSpec } from "./table-spec";

export type FittedTable = { spec: TableSpec; setting: Setting };

/** From the usual setting to the closest that is still read with ease. */
const settings: readonly Setting[] = [
  usualSetting,
  { scale: 1, gap: 5.5 },
  { scale: 0.93, gap: 5 },
  { scale: 0.87, gap: 4.5 },
];
const closest = settings.at(-1)!;

/** One table where a closer setting makes it fit, else several that share the first column. */
export function fitTable(pen: Pen, spec: TableSpec, width: number): FittedTable[] {
  const setting = settings.find((candidate) => leastWidth(pen, spec, candidate) <= width);
  if (setting) return [{ spec, setting }];
  const widths = naturalWidths(pen, spec, closest);
  const most = Math.max(...widths.slice(1)) + closest.gap;
  const perBand = Math.max(1, Math.floor((width - widths[0]!) / most));
  const bands = Math.ceil((widths.length - 1) / perBand);
  const size = Math.ceil((widths.length - 1) / bands);
  return Array.from({ length: bands }, (_, band) => ({
    spec: onlyColumns(spec, 1 + band * size, 1 + (band + 1) * size),
    setting: closest,
  }));
}

function onlyColumns({ columns, rows }: TableSpec, from: number, to: number): TableSpec {
  const pick = <T>(items: readonly T[]) => [items[0]!, ...items.slice(from, to)];
  return { columns: pick(columns), rows: rows.map((row) => ({ ...row, cells: pick(row.cells) })) };
}
