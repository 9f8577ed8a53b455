/**
 * Sum of numbers with the rounding errors carried along, so that neither their order nor their count costs digits.
 *
 * Units: those of the values; range: any whose sum is finite; an empty list gives 0.
 * Source: A. Neumaier, "Rundungsfehleranalyse einiger Verfahren zur Summation endlicher Summen", ZAMM 54 (1974) 39-51.
 */
export function sumOf(values: readonly number[]): number {
  let sum = 0;
  let lost = 0;
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}
