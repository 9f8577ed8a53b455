import Link from "next/link";
import type { ReactNode } from "react";
import { classNames } from "../class-names";
import type { DataColumn } from "./data-table-column";
import { cellStyle } from "./data-table-style";

type Props<Row> = {
  columns: readonly DataColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row, index: number) => string;
  rowHref?: (row: Row) => string | null;
  dense: boolean;
};

export function DataTableBody<Row>({ columns, rows, rowKey, rowHref, dense }: Props<Row>) {
  const hasFoot = columns.some((column) => column.foot !== undefined);
  return (
    <>
      <tbody>
        {rows.map((row, index) => {
          const href = rowHref?.(row) ?? null;
          return (
            <tr
              key={rowKey(row, index)}
              className={classNames(
                "group border-hair-2 not-last:border-b",
                href && "relative hover:bg-raised",
              )}
            >
              {columns.map((column, place) => {
                const content = column.cell(row, index);
                return (
                  <BodyCell key={column.key} column={column} place={place} dense={dense}>
                    {place === 0 && href ? <RowLink href={href}>{content}</RowLink> : content}
                  </BodyCell>
                );
              })}
            </tr>
          );
        })}
      </tbody>
      {hasFoot ? <Foot columns={columns} /> : null}
    </>
  );
}

type CellProps<Row> = { column: DataColumn<Row>; place: number; dense: boolean; children: ReactNode };

function BodyCell<Row>({ column, place, dense, children }: CellProps<Row>) {
  const style = classNames(
    cellStyle(column, place),
    dense ? "py-[5px] leading-[17px]" : "py-2",
    column.wrap ? "min-w-44 wrap-break-word tablet:min-w-0" : "whitespace-nowrap",
  );
  if (place > 0) return <td className={style}>{children}</td>;
  return (
    <th scope="row" className={classNames(style, "font-medium")}>
      {children}
    </th>
  );
}

/** The link's own area covers the row, so that a tap anywhere follows it. */
function RowLink({ href, children }: { href: string; children: ReactNode }) {
  return (
    <Link href={href} className="font-semibold no-underline after:absolute after:inset-0 after:content-['']">
      {children}
    </Link>
  );
}

function Foot<Row>({ columns }: { columns: readonly DataColumn<Row>[] }) {
  return (
    <tfoot>
      <tr className="border-t border-hair">
        {columns.map((column, index) => {
          const style = classNames(
            cellStyle(column, index),
            "py-[7px] leading-[17px] font-medium whitespace-nowrap",
          );
          return index === 0 ? (
            <th key={column.key} scope="row" className={style}>
              {column.foot}
            </th>
          ) : (
            <td key={column.key} className={style}>
              {column.foot}
            </td>
          );
        })}
      </tr>
    </tfoot>
  );
}
