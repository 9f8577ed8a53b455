import { type Conversion, convertConditions } from "../convert-conditions";
import { convertInjector } from "../convert-injector";
import type { OwnFlow } from "../convert-reading";
import type { ChannelCalibration, CycleFigures, CycleInjector, CycleInput, InjectorFigures } from "../types";

/** A pulse width in ms, or null for the held-open column. */
export type Column = number | null;

/** The repeats of one injector in one column. */
export type Cell = {
  /** Flow of each repeat, and their mean. */
  repeats: number[];
  flow: number;
  /** Standard uncertainty of one repeat from resolution and repeatability. */
  u: number;
  /** Mean amount as read, and the flow that another amount would have meant here. */
  amount: number;
  flowOf(amount: number): number;
  /** 0 where held open. */
  pulseCount: number;
};

export type Row = { injectorId: string; figures: InjectorFigures; cells: Map<Column, Cell> };

/** Readings below 100 % duty, by injector in the order of the input. */
export type Grid = { rows: Row[]; widths: number[]; columns: Column[] };

export function layOutGrid(input: CycleInput, figures: CycleFigures): Grid {
  const conversion = convertConditions(input.conditions, input.reference);
  const rows = input.injectors.flatMap((injector) => {
    const ofInjector = figures.injectors.find(({ injectorId }) => injectorId === injector.injectorId);
    const cells = cellsOf(injector, { conditions: input.conditions, conversion });
    return ofInjector ? [{ injectorId: injector.injectorId, figures: ofInjector, cells }] : [];
  });
  const columns = new Set(rows.flatMap(({ cells }) => [...cells.keys()]));
  const widths = [...columns].filter((column) => column !== null).sort((a, b) => a - b);
  return { rows, widths, columns: columns.has(null) ? [...widths, null] : widths };
}

/** An injector with a reading that cannot be computed with has no cells: its `lineProblem` says so already. */
function cellsOf(
  injector: CycleInjector,
  beside: { conditions: CycleInput["conditions"]; conversion: Conversion },
): Map<Column, Cell> {
  const cells = new Map<Column, Cell>();
  try {
    const { pulses, held } = convertInjector(injector, beside);
    const { calibration } = injector.channel;
    const pulsed = pulses.filter(({ dutyPercent, flow }) => dutyPercent < 100 && Number.isFinite(flow));
    for (const width of new Set(pulsed.map((flow) => flow.pulseWidthMs))) {
      const repeats = pulsed.filter(({ pulseWidthMs }) => pulseWidthMs === width);
      cells.set(width, { ...cellOf(repeats, calibration), pulseCount: repeats[0]!.pulseCount });
    }
    if (held.length > 0) cells.set(null, { ...cellOf(held, calibration), pulseCount: 0 });
    return cells;
  } catch (error) {
    if (error instanceof RangeError) return new Map();
    throw error;
  }
}

function cellOf(repeats: readonly OwnFlow[], { gain, offset }: ChannelCalibration): Omit<Cell, "pulseCount"> {
  const mean = (pick: (flow: OwnFlow) => number) =>
    repeats.reduce((sum, flow) => sum + pick(flow) / repeats.length, 0);
  const perAmount = mean((flow) => flow.perOffset);
  return {
    repeats: repeats.map(({ flow }) => flow),
    flow: mean(({ flow }) => flow),
    u: mean(({ resolution, repeatability }) => Math.hypot(resolution, repeatability)),
    amount: mean((flow) => flow.perGain) / perAmount,
    flowOf: (amount) => perAmount * (gain * amount + offset),
  };
}
