import { classNames } from "../class-names";
import type { DataColumn } from "./data-table-column";
import { cellStyle } from "./data-table-style";

export function DataTableHead<Row>({ columns }: { columns: readonly DataColumn<Row>[] }) {
  return (
    <thead>
      <tr>
        {columns.map((column, index) => (
          <th
            key={column.key}
            scope="col"
            className={classNames(
              cellStyle(column, index),
              "border-b border-hair py-[5px] align-bottom text-key font-normal whitespace-nowrap text-ink-2",
            )}
          >
            {column.head}
            {column.unit ? <span className="block">{column.unit}</span> : null}
          </th>
        ))}
      </tr>
    </thead>
  );
}
