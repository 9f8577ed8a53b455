/** What both charts share; colours come from the tokens, so that light and dark follow. */
export const axisStyle = {
  tick: { fill: "var(--color-ink-2)", fontSize: 11.5 },
  tickLine: false,
  axisLine: { stroke: "var(--color-hair)" },
} as const;
export const gridStyle = { stroke: "var(--color-hair-2)", vertical: false } as const;
export const chartHeight = 260;
export const leftInk = "var(--color-petrol)";
export const foundInk = "var(--color-found-edge)";
