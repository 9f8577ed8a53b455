import type { CycleInput, DynamicReading } from "@/metrology";

/** Slips of a technician, made in a copy of a cycle. */
type Alter = (reading: DynamicReading, place: number) => number;

function alterAt(input: CycleInput, pulseWidthMs: number, alter: Alter): CycleInput {
  return {
    ...input,
    injectors: input.injectors.map((injector, place) => ({
      ...injector,
      readings: injector.readings.map((reading) =>
        reading.kind === "dynamic" && reading.pulseWidthMs === pulseWidthMs
          ? { ...reading, amount: alter(reading, place) }
          : reading,
      ),
    })),
  };
}

function amountAt(input: CycleInput, place: number, pulseWidthMs: number): number {
  const { readings } = input.injectors.at(place)!;
  return readings.find((r) => r.kind === "dynamic" && r.pulseWidthMs === pulseWidthMs)!.amount;
}

/** One amount misread by a share. */
export function misread(input: CycleInput, pulseWidthMs: number, place: number, share: number): CycleInput {
  return alterAt(input, pulseWidthMs, ({ amount }, at) => (at === place ? amount * (1 + share) : amount));
}

/** The amounts of two injectors typed in each other's row. */
export function exchange(input: CycleInput, pulseWidthMs: number, [a, b]: [number, number]): CycleInput {
  return alterAt(input, pulseWidthMs, ({ amount }, at) => {
    if (at !== a && at !== b) return amount;
    return amountAt(input, at === a ? b : a, pulseWidthMs);
  });
}

/** A column typed from the second row on; the first row got the last one's amount. */
export function shift(input: CycleInput, pulseWidthMs: number): CycleInput {
  return alterAt(input, pulseWidthMs, (_, at) => amountAt(input, at - 1, pulseWidthMs));
}

/** The amounts of one width typed into the column of another. */
export function typeTwice(input: CycleInput, intoMs: number, fromMs: number): CycleInput {
  return alterAt(input, intoMs, (_, at) => amountAt(input, at, fromMs));
}
