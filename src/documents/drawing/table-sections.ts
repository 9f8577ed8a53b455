import "server-only";
import { stack } from "./block";
import { fitTable } from "./fit-table";
import type { Pen } from "./pen";
import type { Section } from "./sheet";
import { table } from "./table";
import type { TableSpec } from "./table-spec";
import { heading } from "./text-blocks";

/** A heading with its table, which carries both on every page it runs over; several where it is too wide for one. */
export function tableSections(
  pen: Pen,
  { title, note = "" }: { title: string; note?: string },
  spec: TableSpec,
  width: number,
): Section[] {
  return fitTable(pen, spec, width).map((part, index, parts) => {
    const { head, rows } = table(pen, part.spec, width, part.setting);
    const name = parts.length > 1 ? `${title} (${index + 1} of ${parts.length})` : title;
    return {
      lead: stack([heading(pen, name, note, width), head]),
      repeated: stack([heading(pen, `${name}, continued`, note, width), head]),
      rows,
    };
  });
}
