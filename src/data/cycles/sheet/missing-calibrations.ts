import type { InstrumentKind } from "../../../db/vocabulary";
import type { BenchInstrument, CycleBench, Sheet } from "./types";

/** An instrument that a cycle rests on and that is out of calibration, or a place that has none. */
export type MissingCalibration = { place: string; code: string | null; lapsedAt: string | null };

const always: InstrumentKind[] = ["pressure gauge", "thermometer", "pulse timer"];

/** What is out of calibration for this sheet: the channels it uses and the bench's own instruments. */
export function missingCalibrations(bench: CycleBench, sheet: Sheet): MissingCalibration[] {
  return [
    ...channelsUsed(bench, sheet).flatMap(({ number, instrument }) =>
      lacking(`channel ${number}`, instrument),
    ),
    ...kindsUsed(bench, sheet).flatMap((kind) => lacking(kind, instrumentOf(bench, kind))),
  ];
}

/** The bench's own instruments that this sheet rests on. */
export function ownInstrumentsUsed(bench: CycleBench, sheet: Sheet): BenchInstrument[] {
  return kindsUsed(bench, sheet).flatMap((kind) => instrumentOf(bench, kind) ?? []);
}

/** Every instrument that this sheet rests on, cylinders and balances of its channels included. */
export function instrumentsUsed(bench: CycleBench, sheet: Sheet): BenchInstrument[] {
  const ofChannels = channelsUsed(bench, sheet).flatMap((channel) => channel.instrument ?? []);
  return [...ofChannels, ...ownInstrumentsUsed(bench, sheet)];
}

function channelsUsed(bench: CycleBench, sheet: Sheet) {
  const used = new Set(sheet.rows.map((row) => row.channelNumber));
  return bench.channels.filter((channel) => used.has(channel.number));
}

/** A drive supply counts where the bench has one of its own; an ohmmeter when windings were measured. */
function kindsUsed(bench: CycleBench, sheet: Sheet): InstrumentKind[] {
  const windings = sheet.rows.some((row) => row.checks.windingOhm !== null);
  const supply: InstrumentKind[] = instrumentOf(bench, "drive supply") ? ["drive supply"] : [];
  return [...always, ...supply, ...(windings ? (["ohmmeter"] as const) : [])];
}

export function instrumentOf(bench: CycleBench, kind: InstrumentKind): BenchInstrument | null {
  return bench.instruments.find((instrument) => instrument.kind === kind) ?? null;
}

function lacking(place: string, instrument: BenchInstrument | null): MissingCalibration[] {
  if (instrument?.calibration) return [];
  return [{ place, code: instrument?.code ?? null, lapsedAt: instrument?.lapsedAt ?? null }];
}

/** A cycle can be run on it now: in service, with a channel and everything that every cycle needs in calibration. */
export function isReady(bench: CycleBench): boolean {
  return (
    bench.holdReason === null &&
    !bench.retired &&
    bench.channels.some((channel) => channel.instrument?.calibration) &&
    always.every((kind) => instrumentOf(bench, kind)?.calibration)
  );
}
