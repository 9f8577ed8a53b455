import type { ReactNode } from "react";

export type DataColumn<Row> = {
  key: string;
  head: ReactNode;
  /** Second line of the head, where the unit stands. */
  unit?: ReactNode;
  cell: (row: Row, index: number) => ReactNode;
  /** Figures stand at the right, words at the left. */
  align?: "left" | "right" | "center";
  /** Cell of the last row, such as a spread. */
  foot?: ReactNode;
  /** A little more room before this column. */
  gap?: boolean;
  /** Left out on a phone. */
  wideOnly?: boolean;
  wrap?: boolean;
};
