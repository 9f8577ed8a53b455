/** One way of doing the job. */
export type Way = { name: string; run: () => unknown };

export type Measured = { name: string; medianMs: number };

/** What a bench prints; `notes` say what was compared and what a figure means. */
export type BenchTable = { title: string; head: string[]; rows: string[][]; notes: string[] };

type Options = { rounds?: number; warmUpMs?: number; leastTurnMs?: number };

/**
 * Times several ways of one job side by side in one process: after a warm-up they take turns, each time beginning with the
 * next one, so that what slows the machine slows all of them. A short job is repeated until a turn lasts long enough for
 * the clock. Answers with the median time of one call, in the order given.
 */
export async function sideBySide(
  ways: readonly Way[],
  { rounds = 31, warmUpMs = 300, leastTurnMs = 5 }: Options = {},
): Promise<Measured[]> {
  const calls: number[] = [];
  for (const way of ways) {
    await callsFor(way, warmUpMs);
    calls.push(await callsFor(way, leastTurnMs));
  }
  const times = ways.map((): number[] => []);
  for (let round = 0; round < rounds; round++)
    for (let turn = 0; turn < ways.length; turn++) {
      const index = (round + turn) % ways.length;
      times[index]!.push((await timeOf(ways[index]!, calls[index]!)) / calls[index]!);
    }
  return ways.map(({ name }, index) => ({ name, medianMs: medianOf(times[index]!) }));
}

/** Doubles the number of calls until they last long enough. */
async function callsFor(way: Way, leastMs: number): Promise<number> {
  for (let calls = 1; ; calls *= 2) if ((await timeOf(way, calls)) >= leastMs) return calls;
}

async function timeOf({ run }: Way, calls: number): Promise<number> {
  const begin = performance.now();
  for (let call = 0; call < calls; call++) {
    const result = run();
    if (result instanceof Promise) await result;
  }
  return performance.now() - begin;
}

function medianOf(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)]!;
}

/** `0.0123 ms`, `4.56 ms`, `321 ms`: three digits. */
export function inMs(milliseconds: number): string {
  return `${Number(milliseconds.toPrecision(3))} ms`;
}

/** How many times as long one takes as another: `1.00×`, `0.42×`. */
export function ratio(one: Measured, other: Measured): string {
  return `${(one.medianMs / other.medianMs).toFixed(2)}×`;
}
