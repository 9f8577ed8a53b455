import { SimpleLinearRegression } from "ml-regression-simple-linear";
import { linearRegression } from "simple-statistics";
import { normalsFrom } from "../../seed/factories/synthetic-bench";
import { fitFlowLine, fitLine } from "../../src/metrology";
import { publishedCase } from "../support/published-case";
import { type BenchTable, inMs, ratio, sideBySide } from "./measure";

type Data = { xs: number[]; ys: number[] };

const libraries = {
  "simple-statistics": ({ xs, ys }: Data) => {
    const { m, b } = linearRegression(xs.map((x, i) => [x, ys[i]!]));
    return { slope: m, intercept: b };
  },
  "ml-regression-simple-linear": ({ xs, ys }: Data) => {
    const { slope, intercept } = new SimpleLinearRegression(xs, ys);
    return { slope, intercept };
  },
};

/** What the product does to an injector's readings against a bare fit of the same points, in time and in digits. */
export async function benchFlowLine(): Promise<BenchTable[]> {
  const cycles = [
    { name: "7 widths", data: readings([2, 2.5, 3, 4, 6, 10, 15], 1) },
    { name: "12 widths, 3 repeats each", data: readings([2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 10, 12, 15], 3) },
  ];
  const timed: BenchTable[] = [];
  for (const { name, data } of cycles) timed.push(await timesOf(name, data));
  return [...timed, digits()];
}

async function timesOf(name: string, data: Data): Promise<BenchTable> {
  const flowPoints = data.xs.map((x, i) => ({ pulseWidthMs: x, volumePerPulseUl: data.ys[i]! }));
  const points = data.xs.map((x, i) => ({ x, y: data.ys[i]! }));
  const measured = await sideBySide([
    { name: "fitFlowLine: range search, line, dead time and interval", run: () => fitFlowLine(flowPoints) },
    { name: "fitLine: line with its error terms", run: () => fitLine(points) },
    ...Object.entries(libraries).map(([library, bareFit]) => ({
      name: `${library}: slope and intercept`,
      run: () => bareFit(data),
    })),
  ]);
  return {
    title: `Flow line of one injector, ${name}`,
    head: ["", "one call", "fitFlowLine takes"],
    rows: measured.map((way) => [way.name, inMs(way.medianMs), ratio(measured[0]!, way)]),
    notes: ["Medians of 31 alternating rounds. The libraries know neither a linear range nor an interval."],
  };
}

/** NIST StRD Norris: digits that agree with the certified value, 15 at most. */
function digits(): BenchTable {
  type Certified = { x: number[]; y: number[]; expected: { slope: number; intercept: number } };
  const { x: xs, y: ys, expected } = publishedCase<Certified>("regression", "nist-strd-norris");
  const ours = { fitLine: () => fitLine(xs.map((x, i) => ({ x, y: ys[i]! }))) };
  const rows = Object.entries({ ...ours, ...libraries }).map(([name, lineOf]) => {
    const { slope, intercept } = lineOf({ xs, ys });
    return [name, agreement(slope, expected.slope), agreement(intercept, expected.intercept)];
  });
  return {
    title: "Digits of agreement with NIST StRD Norris",
    head: ["", "slope", "intercept"],
    rows,
    notes: ["−log10 of the relative difference from the certified value, which has 15 digits."],
  };
}

function agreement(value: number, certified: number): string {
  return Math.min(15, -Math.log10(Math.abs(value / certified - 1))).toFixed(1);
}

function readings(widths: number[], repeats: number): Data {
  const normal = normalsFrom(1);
  const xs = widths.flatMap((width) => Array<number>(repeats).fill(width));
  return { xs, ys: xs.map((x) => 7.3 * (x - 0.92) * (1 + 0.002 * normal())) };
}
