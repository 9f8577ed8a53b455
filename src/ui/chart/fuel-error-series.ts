/** Each injector's percent error at every pulse width, from the set's mean. */
export type FuelErrorSeries = {
  key: string;
  label: string;
  left: readonly (number | null)[];
  found?: readonly (number | null)[];
};

/** One row per pulse width, as the chart wants it. */
export function fuelErrorRows(widthsMs: readonly number[], series: readonly FuelErrorSeries[]) {
  return widthsMs.map((width, index) => {
    const row: Record<string, number | null> = { width };
    for (const { key, left, found } of series) {
      row[`left ${key}`] = left[index] ?? null;
      if (found) row[`found ${key}`] = found[index] ?? null;
    }
    return row;
  });
}

const roundWidths = [0.5, 1, 1.5, 2, 3, 4, 6, 8, 10, 12, 16, 20, 30];

/** Marks of the width axis: round numbers inside the range, and its ends. */
export function widthTicks(low: number, high: number): number[] {
  const inside = roundWidths.filter((width) => width > low * 1.12 && width < high / 1.12);
  return [low, ...inside, high];
}
