import { spread } from "../line/spread";
import { spreadInterval } from "../line/spread-interval";
import type { DrawOptions } from "../uncertainty/drawn-interval";
import type { SpreadWithInterval } from "./types";

/** One injector's flow with its own standard uncertainty; null where it has none. */
export type OwnValue = { value: number; u: number } | null;

/** Spread of a set with its 95 % interval; null below two injectors, when one lacks the figure, or when none delivers. */
export function spreadOfSet(injectors: readonly OwnValue[], options: DrawOptions): SpreadWithInterval | null {
  const known = injectors.filter((injector) => injector !== null);
  if (known.length < 2 || known.length < injectors.length) return null;
  const values = known.map(({ value }) => value);
  try {
    const interval = spreadInterval(
      values,
      known.map(({ u }) => u),
      options,
    );
    return { ...spread(values), interval, expandedUncertainty: (interval.high - interval.low) / 2 };
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}
