import fc from "fast-check";

/** The same cases on every machine and day. */
fc.configureGlobal({ seed: 26, numRuns: 200 });

/** A plain number of the bench's size, without the crumbs near zero. */
export const number = (min: number, max: number) =>
  fc.double({ min, max, noNaN: true }).map((value) => Number(value.toFixed(9)));

/** Points of some scatter on different x, as a cycle might hold them. */
export const points = fc
  .array(fc.record({ x: number(0.1, 20), y: number(-100, 400) }), { minLength: 3, maxLength: 20 })
  .filter((list) => {
    const xs = list.map(({ x }) => x);
    return Math.max(...xs) - Math.min(...xs) > 0.1;
  });

/** What must never be let in. */
export const unusable = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY, 1e300];
