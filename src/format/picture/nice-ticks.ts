const steps = [1, 2, 2.5, 5, 10];

/** The smallest of 1, 2, 2.5, 5 times a power of ten that is not below the value. */
export function niceCeiling(value: number): number {
  if (!(value > 0)) return 1;
  const power = 10 ** Math.floor(Math.log10(value));
  const step = steps.find((candidate) => candidate * power >= value * (1 - 1e-9)) ?? 10;
  return clean(step * power);
}

/** Round numbers from at or below `low` to at or above `high`, about `count` of them. */
export function niceTicks(low: number, high: number, count = 5): number[] {
  const span = high - low;
  if (!(span > 0)) return [clean(low)];
  const step = niceCeiling(span / Math.max(1, count));
  const first = Math.floor(low / step + 1e-9);
  const last = Math.ceil(high / step - 1e-9);
  return Array.from({ length: last - first + 1 }, (_, index) => clean((first + index) * step));
}

/** Takes off what the binary sum left behind: 0.30000000000000004 → 0.3. */
function clean(value: number): number {
  const rounded = Number(value.toPrecision(12));
  return rounded === 0 ? 0 : rounded;
}
