import type postgres from "postgres";
import type { CycleInput } from "../../src/metrology";
import { asOwner } from "./databases";

type Calibration = { gain: number; offset: number; gainU: number; offsetU: number; division: number };
type Instrument = Calibration & { kind: string };
type Channel = Calibration & { setInjectorId: string };
type Reading = {
  setInjectorId: string;
  pulseWidthMs: number | null;
  pulseCount: number | null;
  openSeconds: number | null;
  amount: number;
};
type Winding = {
  setInjectorId: string;
  windingOhm: number;
  leadOhm: number;
  windingTemperatureC: number;
  leakageMm3PerMin: number;
};

export type RawCycle = Awaited<ReturnType<typeof readRawCycle>>;

/** What the tables hold of one revision of a cycle: as read, with the calibrations it was recorded with. */
export function readRawCycle(revisionId: string) {
  return asOwner(async (sql) => {
    const [conditions] = await sql<Record<string, string>[]>`
      select fluid_temperature_c, pressure_kpa, drive_volts, driver_kind, period_ms, collects, repeatability
        from cycle_revisions where cycle_revision_id = ${revisionId}`;
    return {
      conditions: conditions!,
      instruments: await instrumentsOf(sql, revisionId),
      channels: await channelsOf(sql, revisionId),
      readings: await readingsOf(sql, revisionId),
      windings: await sql<Winding[]>`
        select set_injector_id as "setInjectorId", winding_ohm::float8 as "windingOhm", lead_ohm::float8 as "leadOhm",
               winding_temperature_c::float8 as "windingTemperatureC", leakage_mm3_per_min::float8 as "leakageMm3PerMin"
          from injector_checks where cycle_revision_id = ${revisionId}`,
    };
  });
}

const figures = (sql: postgres.Sql) => sql`
  k.gain::float8, k.offset_value::float8 as "offset", k.gain_u::float8 as "gainU", k.offset_u::float8 as "offsetU",
  i.division::float8`;

function instrumentsOf(sql: postgres.Sql, revisionId: string) {
  return sql<Instrument[]>`
    select i.kind, ${figures(sql)} from cycle_instruments u join calibrations k using (calibration_id)
      join instruments i on i.instrument_id = u.instrument_id where u.cycle_revision_id = ${revisionId}`;
}

function channelsOf(sql: postgres.Sql, revisionId: string) {
  return sql<Channel[]>`
    select u.set_injector_id as "setInjectorId", ${figures(sql)}
      from cycle_injectors u join calibrations k using (calibration_id)
      join instruments i on i.instrument_id = u.instrument_id
      join bench_channels c using (bench_channel_id)
     where u.cycle_revision_id = ${revisionId} order by u.load, c.number`;
}

function readingsOf(sql: postgres.Sql, revisionId: string) {
  return sql<Reading[]>`
    select set_injector_id as "setInjectorId", pulse_width_ms::float8 as "pulseWidthMs", pulse_count as "pulseCount",
           open_seconds::float8 as "openSeconds", amount::float8 as amount
      from readings where cycle_revision_id = ${revisionId} order by reading_id`;
}

/** An indicated value made true: gain · indicated + offset, with its standard uncertainty. */
export function madeTrue(raw: RawCycle, kind: string, indicated: number): { value: number; u: number } {
  const instrument = raw.instruments.find((candidate) => candidate.kind === kind);
  if (!instrument) return { value: indicated, u: 0 };
  const { gain, offset, gainU, offsetU, division } = instrument;
  return {
    value: gain * indicated + offset,
    u: Math.hypot(offsetU, indicated * gainU, division / Math.sqrt(12)),
  };
}

/** The same as the arithmetic takes it, put together without anything of the data layer. Collected was n-heptane. */
export function cycleInputOf(raw: RawCycle, reference: CycleInput["reference"]): CycleInput {
  const indicated = (name: string) => Number(raw.conditions[name]);
  const widths = raw.readings.flatMap(({ pulseWidthMs }) => pulseWidthMs ?? []).sort((a, b) => a - b);
  const pressure = madeTrue(raw, "pressure gauge", indicated("pressure_kpa"));
  const temperature = madeTrue(raw, "thermometer", indicated("fluid_temperature_c"));
  const middleWidth = madeTrue(raw, "pulse timer", widths[Math.floor(widths.length / 2)]!);
  return {
    conditions: {
      fluid: "n-heptane",
      fluidTemperatureC: temperature.value,
      pressureKpa: pressure.value,
      driveVolts: indicated("drive_volts"),
      driverKind: raw.conditions.driver_kind as "saturated",
      periodMs: madeTrue(raw, "pulse timer", indicated("period_ms")).value,
      collects: raw.conditions.collects as "volume",
      shared: { pressureKpa: pressure.u, fluidTemperatureC: temperature.u, pulseWidthMs: middleWidth.u },
      repeatability: indicated("repeatability"),
    },
    reference,
    injectors: raw.channels.map(({ setInjectorId, division, ...calibration }) => ({
      injectorId: setInjectorId,
      channel: { division, calibration },
      readings: raw.readings
        .filter((reading) => reading.setInjectorId === setInjectorId)
        .map((reading) => asReading(raw, reading)),
    })),
  };
}

function asReading(raw: RawCycle, { pulseWidthMs, pulseCount, openSeconds, amount }: Reading) {
  if (pulseWidthMs === null || pulseCount === null)
    return { kind: "held open" as const, openSeconds: openSeconds!, amount };
  const width = madeTrue(raw, "pulse timer", pulseWidthMs).value;
  return { kind: "dynamic" as const, pulseWidthMs: width, pulseCount, amount };
}
