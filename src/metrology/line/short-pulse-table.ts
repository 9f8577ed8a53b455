import type { FlowLine } from "./fit-flow-line";
import { meansByWidth } from "./means-by-width";
import { monotoneCubic } from "./monotone-cubic";

type Node = { pulseWidthMs: number; volumePerPulseUl: number };

/**
 * For the measured pulse widths below the linear range: the extra on-time to command so that the line's fuel is delivered.
 *
 * Between measured widths (means of repeats) the delivered fuel is a monotone cubic; at each width w below the linear
 * range the table asks where that cubic reaches what the line predicts for w, and `adderMs` is that width less w. It can
 * be negative. Nothing is extrapolated: a width is left out where the line predicts no fuel, or fuel that no measured
 * width delivers, and so is everything below a place where the fuel does not rise with the width.
 *
 * Units: ms. Range: any flow line; an empty table when no width lies below its linear range.
 * Throws nothing.
 * Source: interpolation of F. N. Fritsch and R. E. Carlson, SIAM J. Numer. Anal. 17 (1980) 238-246.
 */
export function shortPulseTable(
  flowLine: Pick<FlowLine, "line" | "linearRange" | "points">,
): { pulseWidthMs: number; adderMs: number }[] {
  const { line, linearRange } = flowLine;
  const nodes = risingFromTheTop(meansByWidth(flowLine.points));
  const [first, last] = [nodes[0], nodes.at(-1)];
  if (!first || !last) return [];
  const delivered = monotoneCubic(
    nodes.map((node) => node.pulseWidthMs),
    nodes.map((node) => node.volumePerPulseUl),
  );
  return nodes.flatMap(({ pulseWidthMs }) => {
    const wanted = line.intercept + line.slope * pulseWidthMs;
    const outside = wanted <= 0 || wanted < first.volumePerPulseUl || wanted > last.volumePerPulseUl;
    if (pulseWidthMs >= linearRange.fromMs || outside) return [];
    return [{ pulseWidthMs, adderMs: widthThatDelivers(wanted, nodes, delivered) - pulseWidthMs }];
  });
}

function risingFromTheTop(nodes: Node[]): Node[] {
  const falls = nodes.findLastIndex(
    (node, k) => node.volumePerPulseUl >= (nodes[k + 1]?.volumePerPulseUl ?? Number.POSITIVE_INFINITY),
  );
  return nodes.slice(falls + 1);
}

/** Halves the piece of the cubic that holds the wanted fuel until its ends are neighbouring numbers. */
function widthThatDelivers(wanted: number, nodes: Node[], delivered: (width: number) => number): number {
  const above = Math.max(
    1,
    nodes.findIndex((node) => node.volumePerPulseUl >= wanted),
  );
  let low = nodes[above - 1]!.pulseWidthMs;
  let high = nodes[above]!.pulseWidthMs;
  for (let halving = 0; halving < 60; halving++) {
    const middle = (low + high) / 2;
    if (delivered(middle) < wanted) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
