import type { CertifiedChecks, CertifiedPhase } from "../../../documents/certificate/content";
import type { MeasuredInjector, PhaseResults, UsedCalibration } from "../../cycles/results";
import { deadTimesByVoltage } from "./dead-times-by-voltage";
import { fuelErrorOf } from "./fuel-error-of";
import { shortPulseAdders } from "./short-pulse-adders";

/** One phase as the certificate, the pages and the data sheets state it. */
export function certifyPhase(phase: PhaseResults): CertifiedPhase {
  const { latest, figures, verdict, injectors } = phase;
  const { fluidTemperatureC, pressureKpa, driveVolts, periodMs, driverKind, collects, note } = latest;
  return {
    measuredAt: phase.measuredAt.toISOString(),
    cycleNumber: phase.number,
    revision: latest.revision,
    bench: { code: latest.bench.code, location: latest.bench.location },
    fluid: latest.fluid.name,
    fluidTemperatureC: trueValue(fluidTemperatureC),
    pressureKpa: trueValue(pressureKpa),
    driveVolts: trueValue(driveVolts),
    periodMs: trueValue(periodMs),
    driverKind,
    collects,
    ...whatWasRun(injectors),
    figures,
    verdict,
    checks: injectors.map(certifyChecks),
    fuelError: fuelErrorOf(figures),
    shortPulseAdders: shortPulseAdders(figures),
    deadTimesByVoltage: deadTimesByVoltage(figures, driveVolts.value),
    calibrations: latest.calibrations.map(certifyCalibration),
    note,
  };
}

function trueValue({ value, standardUncertainty }: { value: number; standardUncertainty: number }) {
  return { value, standardUncertainty };
}

/** Pulse widths and counts as commanded; repeats as the injector with most of them had. */
function whatWasRun(injectors: MeasuredInjector[]): Pick<CertifiedPhase, "widths" | "heldOpenSeconds"> {
  const readings = injectors.flatMap((injector) => injector.readings);
  const widths = new Map<number, CertifiedPhase["widths"][number]>();
  for (const { pulseWidthMs, pulseCount, repeat } of readings) {
    if (pulseWidthMs === null || pulseCount === null) continue;
    const known = widths.get(pulseWidthMs) ?? { pulseWidthMs, pulseCount, repeats: 0 };
    widths.set(pulseWidthMs, { ...known, repeats: Math.max(known.repeats, repeat) });
  }
  return {
    widths: [...widths.values()].sort((one, other) => one.pulseWidthMs - other.pulseWidthMs),
    heldOpenSeconds: readings.find((reading) => reading.openSeconds !== null)?.openSeconds ?? null,
  };
}

function certifyChecks({
  setInjectorId,
  channelNumber,
  load,
  resistance,
  checks,
}: MeasuredInjector): CertifiedChecks {
  const { leakageMm3PerMin, leakagePressureKpa, leakageSeconds, insulationMegohm, sprayGrade, note } = checks;
  const leakage =
    leakageMm3PerMin === null || leakagePressureKpa === null || leakageSeconds === null
      ? null
      : { mm3PerMin: leakageMm3PerMin, pressureKpa: leakagePressureKpa, seconds: leakageSeconds };
  return {
    injectorId: setInjectorId,
    channelNumber,
    load,
    resistance,
    insulationMegohm,
    leakage,
    sprayGrade,
    note,
  };
}

function certifyCalibration(used: UsedCalibration) {
  return {
    instrumentCode: used.instrumentCode,
    kind: used.kind,
    channelNumber: used.channelNumber,
    reference: used.reference,
    validFrom: used.validFrom.toISOString(),
    validUntil: used.validUntil.toISOString(),
  };
}
