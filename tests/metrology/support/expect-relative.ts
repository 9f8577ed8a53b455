import { expect } from "vitest";

/** Lets the two differ by a share of what is expected. */
export function expectRelative(actual: number | null | undefined, expected: number, tolerance: number): void {
  expect(actual, `expected ${expected}`).toBeTypeOf("number");
  const difference = Math.abs(actual! - expected);
  const share = expected === 0 ? difference : difference / Math.abs(expected);
  expect(share, `${actual} against ${expected}`).toBeLessThanOrEqual(tolerance);
}
