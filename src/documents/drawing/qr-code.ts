import "server-only";
import { create } from "qrcode";
import type { Block } from "./block";
import type { Pen } from "./pen";
import { colours } from "./print-style";

/** Modules without light around them that scanners ask for. */
const quiet = 4;

/** Drawn of squares, so that it stays sharp at any size. The quiet zone is part of the block. */
export function qrCode({ doc }: Pen, text: string, size: number): Block {
  const { modules } = create(text, { errorCorrectionLevel: "M" });
  const unit = size / (modules.size + 2 * quiet);
  return {
    height: size,
    draw(x, y) {
      for (let row = 0; row < modules.size; row += 1)
        for (const { from, length } of darkRuns(modules, row))
          doc.rect(x + (from + quiet) * unit, y + (row + quiet) * unit, length * unit, unit);
      doc.fill(colours.ink);
    },
  };
}

type Modules = { size: number; get(row: number, column: number): number };

function darkRuns(modules: Modules, row: number): { from: number; length: number }[] {
  const runs: { from: number; length: number }[] = [];
  for (let column = 0; column < modules.size; column += 1) {
    if (!modules.get(row, column)) continue;
    const last = runs.at(-1);
    if (last && last.from + last.length === column) last.length += 1;
    else runs.push({ from: column, length: 1 });
  }
  return runs;
}
