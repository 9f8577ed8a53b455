/**
 * Monotone piecewise cubic through nodes (xs rising): between two nodes it never leaves their values, and it rises or
 * falls only where they do. Slopes start from the parabola through three neighbours and are drawn in where needed.
 * The caller stays between the first and the last node.
 *
 * Source: F. N. Fritsch and R. E. Carlson, SIAM J. Numer. Anal. 17 (1980) 238-246.
 */
export function monotoneCubic(xs: readonly number[], ys: readonly number[]): (x: number) => number {
  if (xs.length === 1) return () => ys[0]!;
  const secants = xs.slice(1).map((x, k) => (ys[k + 1]! - ys[k]!) / (x - xs[k]!));
  const slopes = drawnIn(parabolaSlopes(xs, secants), secants);
  return (x) => {
    const k = Math.max(
      0,
      Math.min(
        xs.length - 2,
        xs.findLastIndex((node) => node <= x),
      ),
    );
    const width = xs[k + 1]! - xs[k]!;
    const s = (x - xs[k]!) / width;
    const t = 1 - s;
    return (
      ys[k]! * t * t * (1 + 2 * s) +
      ys[k + 1]! * s * s * (1 + 2 * t) +
      width * s * t * (slopes[k]! * t - slopes[k + 1]! * s)
    );
  };
}

function parabolaSlopes(xs: readonly number[], secants: readonly number[]): number[] {
  const last = secants.length - 1;
  const width = (k: number) => xs[k + 1]! - xs[k]!;
  if (last === 0) return [secants[0]!, secants[0]!];
  const inner = secants.slice(1).map((right, k) => {
    const share = width(k) / (width(k) + width(k + 1));
    return secants[k]! * (1 - share) + right * share;
  });
  return [2 * secants[0]! - inner[0]!, ...inner, 2 * secants[last]! - inner.at(-1)!];
}

/** Keeps each pair of slopes inside the circle of radius 3 in units of the secant between them. */
function drawnIn(start: number[], secants: readonly number[]): number[] {
  const slopes = [...start];
  secants.forEach((secant, k) => {
    if (secant === 0) {
      slopes[k] = 0;
      slopes[k + 1] = 0;
      return;
    }
    const left = Math.max(0, slopes[k]! / secant);
    const right = Math.max(0, slopes[k + 1]! / secant);
    const reach = Math.hypot(left, right);
    const factor = reach > 3 ? 3 / reach : 1;
    slopes[k] = factor * left * secant;
    slopes[k + 1] = factor * right * secant;
  });
  return slopes;
}
