/**
 * A second way to a cycle's figures, for comparison: school formulas written out from the readings, and nothing of
 * src/. Pulse counts that differ weigh the points; with equal counts all weigh the same.
 */
export type Correction = { gain: number; offset: number };

export type RawCycle = {
  temperatureC: number;
  pressureKpa: number;
  division: number;
  repeatability: number;
  instruments: { gauge: Correction; thermometer: Correction; timer: Correction; ohmmeter: Correction };
  reference: { pressureKpa: number; densityGPerMl: number };
  widths: { ms: number; count: number }[];
  heldOpenSeconds: number;
  injectors: RawInjector[];
};

export type RawInjector = {
  channel: Correction;
  /** mL at each width, in the order of `widths`. */
  amounts: number[];
  heldOpenMl: number;
  winding: { ohm: number; temperatureC: number };
};

export type IndependentInjector = ReturnType<typeof figuresOf>;

export function independentFigures(cycle: RawCycle) {
  const injectors = cycle.injectors.map((injector) => figuresOf(cycle, injector));
  return {
    injectors,
    spreads: cycle.widths.map((_, index) => spreadPercent(injectors.map(({ flows }) => flows[index]!))),
    staticSpread: spreadPercent(injectors.map(({ staticFlow }) => staticFlow)),
    staticMean: injectors.reduce((sum, { staticFlow }) => sum + staticFlow, 0) / injectors.length,
    deadTimeRange: rangeOf(injectors.map(({ deadTime }) => deadTime)),
    resistanceRange: rangeOf(injectors.map(({ ohmsAt20C }) => ohmsAt20C)),
  };
}

export function deviationsPercent(values: number[]): number[] {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return values.map((value) => (100 * (value - mean)) / mean);
}

function figuresOf(cycle: RawCycle, { channel, amounts, heldOpenMl, winding }: RawInjector) {
  const { gauge, thermometer, timer, ohmmeter } = cycle.instruments;
  const pressure = apply(gauge, cycle.pressureKpa);
  const density = heptaneDensity(apply(thermometer, cycle.temperatureC));
  const factor =
    Math.sqrt(density / cycle.reference.densityGPerMl) * Math.sqrt(cycle.reference.pressureKpa / pressure);
  const points = cycle.widths.map(({ ms, count }, index) => {
    const perMl = (1000 / count) * factor;
    const u = perMl * Math.hypot((channel.gain * cycle.division) / Math.sqrt(12), cycle.repeatability);
    return { x: apply(timer, ms), y: perMl * apply(channel, amounts[index]!), u };
  });
  const weighted = new Set(cycle.widths.map(({ count }) => count)).size > 1;
  const line = bestRun(points, weighted);
  const heldOpen = ((60 * apply(channel, heldOpenMl)) / cycle.heldOpenSeconds) * factor;
  const staticFlow = 60 * line.slope;
  return {
    flows: points.map(({ y }) => y),
    staticFlow,
    heldOpen,
    closurePercent: (100 * (staticFlow - heldOpen)) / heldOpen,
    deadTime: -line.intercept / line.slope,
    interval: fieller(line),
    range: { from: line.points[0]!.x, to: line.points.at(-1)!.x },
    ohmsAt20C: (apply(ohmmeter, winding.ohm) * 254.5) / (234.5 + apply(thermometer, winding.temperatureC)),
  };
}

function apply({ gain, offset }: Correction, indicated: number): number {
  return gain * indicated + offset;
}

/** kg/m³ at 101.325 kPa: Span and Wagner, Int. J. Thermophys. 24 (2003) 41, straight between the values. */
const heptane = [
  [10, 692.2],
  [15, 688.015],
  [20, 683.815],
  [25, 679.598],
  [30, 675.362],
] as const;

function heptaneDensity(celsius: number): number {
  const above = heptane.findIndex(([t]) => t >= celsius);
  const [t1, d1] = heptane[above]!;
  const [t0, d0] = heptane[above - 1] ?? heptane[above]!;
  return (t1 === t0 ? d1 : d0 + ((d1 - d0) * (celsius - t0)) / (t1 - t0)) / 1000;
}

type Point = { x: number; y: number; u: number };

/** Normal equations with plain sums: another road than the product's centred ones. */
function leastSquares(points: Point[], weighted: boolean) {
  const w = points.map(({ u }) => (weighted ? 1 / (u * u) : 1));
  const sum = (of: (point: Point) => number) =>
    points.reduce((total, point, i) => total + w[i]! * of(point), 0);
  const [s, sx, sy] = [sum(() => 1), sum(({ x }) => x), sum(({ y }) => y)];
  const [sxx, sxy] = [sum(({ x }) => x * x), sum(({ x, y }) => x * y)];
  const determinant = s * sxx - sx * sx;
  const slope = (s * sxy - sx * sy) / determinant;
  const intercept = (sxx * sy - sx * sxy) / determinant;
  const residual = sum(({ x, y }) => (y - intercept - slope * x) ** 2) / (points.length - 2);
  const scale = weighted ? 1 : residual;
  return {
    points,
    slope,
    intercept,
    variances: {
      slope: (scale * s) / determinant,
      intercept: (scale * sxx) / determinant,
      both: (-scale * sx) / determinant,
    },
  };
}

type Line = ReturnType<typeof leastSquares>;

/** Every run of neighbouring widths, three or more, whose line predicts its own readings within 5 %: the widest. */
function bestRun(points: Point[], weighted: boolean): Line {
  const runs = points.flatMap((_, from) =>
    points
      .slice(from + 2)
      .map((_, more) => leastSquares(points.slice(from, from + 3 + more), weighted))
      .filter(({ points: run, slope, intercept }) =>
        run.every(({ x, y }) => Math.abs(y / (intercept + slope * x) - 1) <= 0.05),
      ),
  );
  const ratio = ({ points: run }: Line) => run.at(-1)!.x / run[0]!.x;
  return runs.reduce((best, run) => (ratio(run) > ratio(best) ? run : best));
}

/** Student's t at 97.5 %, from the table of the NIST/SEMATECH e-Handbook, 1.3.6.7.2. */
const student = [12.706, 4.303, 3.182, 2.776, 2.571, 2.447, 2.365, 2.306];

/** Where a + b·x = 0 can lie: the roots of (a + b·x)² = t²·var(a + b·x). Fieller 1954. */
function fieller({ points, slope, intercept, variances }: Line): [number, number] {
  const t2 = student[points.length - 3]! ** 2;
  const a = slope * slope - t2 * variances.slope;
  const b = slope * intercept - t2 * variances.both;
  const c = intercept * intercept - t2 * variances.intercept;
  const root = Math.sqrt(b * b - a * c);
  return [(-b - root) / a, (-b + root) / a];
}

function rangeOf(values: number[]): number {
  return Math.max(...values) - Math.min(...values);
}

function spreadPercent(values: number[]): number {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return (100 * rangeOf(values)) / mean;
}
