import type { Correction, RawInjector } from "../../support/independent-figures";

/** What an injector really does. Synthetic: invented, and stated. */
export type Truth = { staticMlPerMin: number; deadTimeMs: number; ohmsAt20C: number };

export const widths = [
  { ms: 1.5, count: 3000 },
  { ms: 2, count: 2000 },
  { ms: 3, count: 1000 },
  { ms: 4, count: 1000 },
  { ms: 6, count: 1000 },
  { ms: 8, count: 1000 },
  { ms: 10, count: 1000 },
];
export const heldOpenSeconds = 10;

const windingTemperatureC = 23;

/** The readings of a run on a bench that rounds to its division, with a small scatter that is the same in every run. */
export function readingsOf(
  truths: Truth[],
  channels: Correction[],
  { divisionMl, scatterMl = 0.05 }: { divisionMl: number; scatterMl?: number },
): RawInjector[] {
  const read = (trueMl: number, { gain, offset }: Correction) =>
    Math.round((trueMl - offset) / gain / divisionMl) * divisionMl;
  return truths.map(({ staticMlPerMin, deadTimeMs, ohmsAt20C }, place) => {
    const channel = channels[place % channels.length]!;
    const amounts = widths.map(({ ms, count }, column) => {
      const ml = ((staticMlPerMin / 60) * (ms - deadTimeMs) * count) / 1000;
      return tidy(read(ml + scatterMl * Math.sin(7 * place + 3 * column), channel));
    });
    return {
      channel,
      amounts,
      heldOpenMl: tidy(read((staticMlPerMin / 60) * heldOpenSeconds, channel)),
      winding: {
        ohm: tidy(ohmsAt20C * ((234.5 + windingTemperatureC) / 254.5)),
        temperatureC: windingTemperatureC,
      },
    };
  });
}

function tidy(value: number): number {
  return Number(value.toFixed(2));
}

/** As a spreadsheet puts it on the clipboard: a line for each injector, a tab between the widths. */
export function asPasted(injectors: RawInjector[]): string {
  return injectors.map(({ amounts, heldOpenMl }) => [...amounts, heldOpenMl].join("\t")).join("\n");
}
