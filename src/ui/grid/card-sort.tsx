"use client";
import { Select } from "../form/select";
import type { GridColumn, GridSort } from "./server-grid-types";

type Props<Row> = {
  columns: readonly GridColumn<Row>[];
  sort: GridSort[];
  onSort: (sort: GridSort[]) => void;
};

/** What the heads of the grid do on a wide screen. */
export function CardSort<Row>({ columns, sort, onSort }: Props<Row>) {
  const sortable = columns.filter((column) => column.sortable);
  if (sortable.length < 2) return null;
  const [first] = sort;

  function choose(value: string) {
    const [column, direction] = value.split(" ");
    if (column) onSort([{ column, direction: direction === "desc" ? "desc" : "asc" }]);
  }

  return (
    <div className="px-4 pt-3">
      <Select
        label="Order"
        labelHidden
        value={first ? `${first.column} ${first.direction}` : ""}
        placeholder={first ? undefined : "Order"}
        onChange={(event) => choose(event.target.value)}
        options={sortable.flatMap(({ key, head }) => [
          { value: `${key} asc`, label: `${head}, rising` },
          { value: `${key} desc`, label: `${head}, falling` },
        ])}
      />
    </div>
  );
}
