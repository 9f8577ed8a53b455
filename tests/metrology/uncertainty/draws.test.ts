import { describe, expect, test } from "vitest";
import { readingResolution } from "@/metrology";
import { chiSquareQuantile } from "@/metrology/uncertainty/quantiles";
import { standardNormals } from "@/metrology/uncertainty/standard-normals";
import { uniformGenerator } from "@/metrology/uncertainty/uniform-generator";

describe("uniform draws", () => {
  test("fill 100 boxes evenly: chi-square within its central 99.9 %", () => {
    const uniform = uniformGenerator(1);
    const boxes = new Array<number>(100).fill(0);
    for (let i = 0; i < 100_000; i++) boxes[Math.floor(100 * uniform())]! += 1;
    const chiSquare = boxes.reduce((sum, count) => sum + (count - 1000) ** 2 / 1000, 0);
    expect(chiSquare).toBeGreaterThan(chiSquareQuantile(0.0005, 99));
    expect(chiSquare).toBeLessThan(chiSquareQuantile(0.9995, 99));
  });

  test("neighbouring seeds do not follow each other", () => {
    const [a, b] = [uniformGenerator(5), uniformGenerator(6)];
    const products = Array.from({ length: 20_000 }, () => (a() - 0.5) * (b() - 0.5));
    const correlation = (12 * products.reduce((sum, product) => sum + product, 0)) / products.length;
    expect(Math.abs(correlation)).toBeLessThan(4 / Math.sqrt(products.length));
  });

  test("are the same for the same seed", () => {
    const [a, b] = [uniformGenerator(-3), uniformGenerator(-3)];
    for (let i = 0; i < 100; i++) expect(a()).toBe(b());
  });
});

test("normal draws: moments of 200 000 within four standard errors", () => {
  const draws = standardNormals(11, 200_000).subarray(0, 200_000);
  const moment = (power: number) => draws.reduce((sum, z) => sum + z ** power, 0) / draws.length;
  const near = (value: number, wanted: number, variance: number) =>
    expect(Math.abs(value - wanted)).toBeLessThan(4 * Math.sqrt(variance / draws.length));
  near(moment(1), 0, 1);
  near(moment(2), 1, 2);
  near(moment(3), 0, 15);
  near(moment(4), 3, 96);
});

test("a division read is worth division/√12 (GUM F.2.2.1)", () => {
  expect(readingResolution(0.2)).toBeCloseTo(0.057735, 6);
  expect(() => readingResolution(-1)).toThrow(/division must be a number from 0/);
});
