/** What a number may be. Without a limit of its own it lies within ±1e100, so that squares stay finite. */
export type Limits = { above?: number; from?: number; below?: number; upTo?: number };

const largest = 1e100;

/**
 * Lets a number through that is finite and within its limits.
 * @throws RangeError naming the argument, the limit and what was given.
 */
export function requireNumber(name: string, value: number, limits: Limits = {}): number {
  const { above, from = -largest, below, upTo = largest } = limits;
  const within =
    typeof value === "number" &&
    value >= from &&
    value <= upTo &&
    (above === undefined || value > above) &&
    (below === undefined || value < below);
  if (!within) throw new RangeError(`${name} must be a number ${nameLimits(limits)}: ${value} was given`);
  return value;
}

function nameLimits({ above, from, below, upTo }: Limits): string {
  const low = above === undefined ? `from ${from ?? -largest}` : `above ${above}`;
  const high = below === undefined ? `up to ${upTo ?? largest}` : `below ${below}`;
  return `${low} and ${high}`;
}

/**
 * Lets a result through that is finite.
 * @throws RangeError naming the arguments it was made of, when they are too large, too small or too alike to compute with.
 */
export function requireFinite(names: string, result: number): number {
  if (Number.isFinite(result)) return result;
  throw new RangeError(`${names}: too large, too small or too alike to compute with (limit ±1e308)`);
}

/** A probability strictly between 0 and 1, as confidences and risks are. */
export function requireProbability(name: string, value: number): number {
  return requireNumber(name, value, { above: 0, below: 1 });
}
