import "server-only";
import { line } from "./lines";
import type { PageSize } from "./open-document";
import type { Pen } from "./pen";
import { colours, leadingOf, styles } from "./print-style";
import { baselineOf } from "./text-blocks";

export type Running = {
  page: PageSize;
  margin: number;
  /** At the head of every page but the first. */
  head: { left: string; right: string };
  foot: string;
};

const key = styles.key;

/** Height that the running head takes; a long name of a lab needs more than one line. */
export function runningHeadHeight(pen: Pen, running: Running): number {
  return headLines(pen, running).length * leadingOf(key) + 10;
}

/** Goes over all pages at the end, when their number is known. */
export function drawRunning(pen: Pen, running: Running, top: number, bottom: number): void {
  const { page, margin, foot } = running;
  const right = page.width - margin;
  const { count } = pen.doc.bufferedPageRange();
  for (let index = 0; index < count; index += 1) {
    pen.doc.switchToPage(index);
    if (index > 0) drawHead(pen, running, top);
    line(pen, [margin, bottom], [right, bottom], { colour: colours.hair });
    const baseline = baselineOf(bottom + 4, key);
    pen.write(foot, margin, baseline, key);
    pen.write(`page ${index + 1} of ${count}`, right, baseline, { ...key, weight: 500 }, "right");
  }
}

function drawHead(pen: Pen, running: Running, top: number): void {
  const { page, margin, head } = running;
  const lines = headLines(pen, running);
  for (const [index, text] of lines.entries())
    pen.write(text, margin, baselineOf(top + index * leadingOf(key), key), key);
  pen.write(head.right, page.width - margin, baselineOf(top, key), { ...key, weight: 500 }, "right");
  const y = top + lines.length * leadingOf(key) + 3;
  line(pen, [margin, y], [page.width - margin, y], { colour: colours.hair });
}

function headLines(pen: Pen, { page, margin, head }: Running): string[] {
  const room = page.width - 2 * margin - pen.measure(head.right, { ...key, weight: 500 }) - 16;
  return pen.wrap(head.left, room, key);
}
