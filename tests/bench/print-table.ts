import type { BenchTable } from "./measure";

export function printTable({ title, head, rows, notes }: BenchTable): void {
  const lines = [head, ...rows];
  const widths = head.map((_, column) => Math.max(...lines.map((line) => line[column]?.length ?? 0)));
  const write = (line: string[]) =>
    line
      .map((cell, column) => (column === 0 ? cell.padEnd(widths[column]!) : cell.padStart(widths[column]!)))
      .join("  ");
  console.log(`\n${title}\n`);
  console.log(write(head));
  console.log(widths.map((width) => "-".repeat(width)).join("  "));
  for (const row of rows) console.log(write(row));
  if (notes.length > 0) console.log(`\n${notes.join("\n")}`);
}
