import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { correctFlow, type Fluid, fluidDensity } from "@/metrology";
import { fluidExpansion } from "@/metrology/fluids/fluid-expansion";
import { monotoneCubic } from "@/metrology/line/monotone-cubic";
import { publishedCase } from "../support/published-case";
import { expectRelative } from "./support/expect-relative";
import { number } from "./support/numbers";

type Densities = { values: { t_C: number; rho_kg_m3: number; source?: string }[] };
type Corrections = { values: { rho15_kg_m3: number; t_C: number; alpha15_per_K: number; VCF: number }[] };

const ofFluid = (densityAt15GPerMl: number, expansionPerK: number): Fluid => ({
  name: "calibration fluid",
  densityAt15GPerMl,
  expansionPerK,
});

describe("n-heptane", () => {
  const { values } = publishedCase<Densities>("fluid-density", "n-heptane-density");
  test.each(values)("Span and Wagner 2003 at $t_C °C: $rho_kg_m3", ({ t_C, rho_kg_m3 }) =>
    expect(fluidDensity("n-heptane", t_C)).toBeCloseTo(rho_kg_m3 / 1000, 12),
  );

  test("a cubic through every 10 °C foretells the values between within 2 parts in 100 000", () => {
    const nodes = values.filter(({ t_C }) => t_C % 10 === 0);
    const density = monotoneCubic(
      nodes.map(({ t_C }) => t_C),
      nodes.map(({ rho_kg_m3 }) => rho_kg_m3),
    );
    for (const { t_C, rho_kg_m3 } of values) expectRelative(density(t_C), rho_kg_m3, 2e-5);
  });

  const elsewhere = publishedCase<Densities>("fluid-density", "n-heptane-density-elsewhere").values;
  test.each(elsewhere)("$source at $t_C °C within 0.03 %", ({ t_C, rho_kg_m3 }) =>
    expectRelative(fluidDensity("n-heptane", t_C), rho_kg_m3 / 1000, 3e-4),
  );

  type Expansions = { values: { t_C: number; alpha_per_K: number }[] };
  const { values: expansions } = publishedCase<Expansions>("fluid-density", "n-heptane-expansion-a");
  test.each(expansions)("expands by $alpha_per_K per K at $t_C °C", ({ t_C, alpha_per_K }) =>
    expectRelative(fluidExpansion("n-heptane", t_C), alpha_per_K, 5e-3),
  );
});

describe("another fluid, by ASTM D1250-80", () => {
  const { values } = publishedCase<Corrections>("fluid-density", "vcf-a");
  test.each(values)("$rho15_kg_m3 kg/m³ at $t_C °C: $VCF", ({ rho15_kg_m3, t_C, alpha15_per_K, VCF }) => {
    const rho15 = rho15_kg_m3 / 1000;
    expect(fluidDensity(ofFluid(rho15, alpha15_per_K), t_C) / rho15).toBeCloseTo(VCF, 6);
  });
});

test("density falls as the fluid warms, and never leaves the numbers", () =>
  fc.assert(
    fc.property(number(0, 39), number(0.01, 1), number(0.0001, 0.003), (cool, step, expansion) => {
      for (const fluid of ["n-heptane", ofFluid(0.75, expansion)] as const)
        expect(fluidDensity(fluid, cool + step)).toBeLessThan(fluidDensity(fluid, cool));
    }),
  ));

test.each([
  ["n-heptane", 41, /temperatureC of n-heptane must be a number from 0 and up to 40: 41 was given/],
  ["n-heptane", Number.NaN, /temperatureC/],
  [ofFluid(0.75, 0.001), 95, /temperatureC must be a number from -20 and up to 90/],
  [ofFluid(7.5, 0.001), 20, /densityAt15GPerMl must be a number from 0.3 and up to 2/],
  [ofFluid(0.75, 0.1), 20, /expansionPerK must be a number from 0 and up to 0.003/],
] as const)("refuses %j at %s °C", (fluid, temperature, message) =>
  expect(() => fluidDensity(fluid, temperature)).toThrow(message),
);

describe("brought to the reference", () => {
  const same = {
    basis: "volume",
    kind: "static",
    densityGPerMl: 0.68,
    referenceDensityGPerMl: 0.68,
  } as const;

  type Rail = { points: { p: number; q: number; sqrt_law_from_ref: number }[]; reference_p: number };
  const { points, reference_p } = publishedCase<Rail>("pressure-law", "gdi-mit-map");
  const reference = points.find(({ p }) => p === reference_p)!;
  test.each(points)("root law from the Sloan laboratory's map: $p kPa", ({ p, q, sqrt_law_from_ref }) => {
    const { value } = correctFlow(reference.q, {
      ...same,
      pressureKpa: reference_p,
      referencePressureKpa: p,
    });
    expectRelative(value, sqrt_law_from_ref, 5e-5);
    expectRelative(value, q, 0.0175);
  });

  const at = { ...same, pressureKpa: 300, referencePressureKpa: 300, referenceDensityGPerMl: 0.72 };
  test("a denser fluid flows less by volume and more by mass", () => {
    const volume = correctFlow(440, at).value;
    const mass = correctFlow(440, { ...at, basis: "mass" }).value;
    expectRelative(volume, 440 * Math.sqrt(0.68 / 0.72), 1e-14);
    expectRelative(mass, 440 * Math.sqrt(0.72 / 0.68), 1e-14);
  });

  test.each([
    [291, true],
    [290.9, false],
    [309, true],
    [309.1, false],
  ])("a dynamic reading at %s kPa of 300: within reach %s", (pressureKpa, withinRange) => {
    const corrected = correctFlow(10, { ...same, kind: "dynamic", pressureKpa, referencePressureKpa: 300 });
    expect(corrected.withinRange).toBe(withinRange);
    expectRelative(corrected.factor, withinRange ? Math.sqrt(300 / pressureKpa) : 1, 1e-14);
  });

  test("and back is where it came from", () =>
    fc.assert(
      fc.property(number(100, 900), number(150, 600), number(150, 600), (flow, from, to) => {
        const there = correctFlow(flow, { ...at, pressureKpa: from, referencePressureKpa: to }).value;
        const back = correctFlow(there, {
          ...at,
          pressureKpa: to,
          referencePressureKpa: from,
          densityGPerMl: 0.72,
          referenceDensityGPerMl: 0.68,
        });
        expectRelative(back.value, flow, 1e-13);
      }),
    ));

  test.each([
    ["pressureKpa", 0],
    ["referencePressureKpa", -1],
    ["densityGPerMl", Number.NaN],
    ["referenceDensityGPerMl", 0],
  ])("refuses a %s of %s", (name, value) =>
    expect(() => correctFlow(10, { ...at, [name]: value })).toThrow(
      new RegExp(`^${name} must be a number above 0`),
    ),
  );
});
