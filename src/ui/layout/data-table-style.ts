import { classNames } from "../class-names";
import type { DataColumn } from "./data-table-column";

type Placed = Pick<DataColumn<unknown>, "align" | "gap" | "wideOnly">;

const alignments = { left: "text-left", right: "text-right", center: "text-center" };

/** What head, body and foot cells of a column share. The first column stays while the others scroll. */
export function cellStyle({ align = "left", gap, wideOnly }: Placed, index: number): string {
  return classNames(
    alignments[align],
    gap ? "pr-[9px] pl-[22px]" : "px-[9px]",
    index === 0 && "sticky left-0 z-10 bg-sheet pl-4 group-hover:bg-raised",
    wideOnly && "hidden tablet:table-cell",
    "last:pr-4",
  );
}

/** What only readers hear stands in its place and not on the page, so that it cannot widen the page. */
export const scrollStyle = "relative overflow-x-auto -outline-offset-2 thin-scrollbar";
