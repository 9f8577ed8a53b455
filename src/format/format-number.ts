import { type Quantity, type QuantityFormat, quantities } from "./quantities";

/** Stands where there is no figure. */
export const noFigure = "–";
const minus = "\u2212";
const noBreak = "\u00a0";

type Maybe = number | null | undefined;

/** The digits alone, with a real minus sign: for a column whose head names the unit. */
export function formatNumber(value: Maybe, quantity: Quantity): string {
  return isFigure(value) ? withMinus(digitsOf(value, quantity)) : noFigure;
}

/** With the unit behind it: `442.3 mL/min`. */
export function formatQuantity(value: Maybe, quantity: Quantity): string {
  return isFigure(value) ? withUnit(formatNumber(value, quantity), quantity) : noFigure;
}

/** A deviation says its direction: `+1.20`, `−0.30`, `0.00`. */
export function formatSigned(value: Maybe, quantity: Quantity): string {
  if (!isFigure(value)) return noFigure;
  const digits = digitsOf(value, quantity);
  return Number(digits) > 0 ? `+${digits}` : withMinus(digits);
}

/** The same digits for data files: decimal point, ASCII minus, nothing where there is no figure. */
export function dataNumber(value: Maybe, quantity: Quantity): string {
  return isFigure(value) ? digitsOf(value, quantity) : "";
}

/** `0.942 ± 0.011`: the uncertainty at the decimals of its value, and never rounded away to nothing. None is not zero. */
export function formatWithUncertainty(
  value: Maybe,
  expanded: Maybe,
  quantity: Quantity,
  { unit = false }: { unit?: boolean } = {},
): string {
  if (!isFigure(value)) return noFigure;
  const both =
    isFigure(expanded) && expanded > 0
      ? `${formatNumber(value, quantity)} ± ${formatUncertainty(expanded, quantity)}`
      : formatNumber(value, quantity);
  return unit ? withUnit(both, quantity) : both;
}

export function formatUncertainty(expanded: Maybe, quantity: Quantity): string {
  if (!isFigure(expanded)) return noFigure;
  const { decimals } = quantities[quantity];
  const digits = expanded.toFixed(decimals);
  return expanded > 0 && Number(digits) === 0 ? (10 ** -decimals).toFixed(decimals) : digits;
}

/** `1.5 … 10 ms`, `0.931 … 0.953 ms`. */
export function formatRange(low: Maybe, high: Maybe, quantity: Quantity): string {
  if (!isFigure(low) || !isFigure(high)) return noFigure;
  return withUnit(`${formatNumber(low, quantity)} … ${formatNumber(high, quantity)}`, quantity);
}

function isFigure(value: Maybe): value is number {
  return typeof value === "number" && Number.isFinite(value);
}

function digitsOf(value: number, quantity: Quantity): string {
  const { decimals, trim }: QuantityFormat = quantities[quantity];
  const fixed = value.toFixed(decimals);
  const digits = trim && decimals > 0 ? fixed.replace(/\.?0+$/, "") : fixed;
  return Number(digits) === 0 ? digits.replace("-", "") : digits;
}

function withMinus(digits: string): string {
  return digits.replace("-", minus);
}

function withUnit(digits: string, quantity: Quantity): string {
  const { unit }: QuantityFormat = quantities[quantity];
  return unit === "" ? digits : `${digits}${noBreak}${unit}`;
}
