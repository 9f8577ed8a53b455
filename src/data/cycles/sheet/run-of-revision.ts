import type { CycleRevision, UsedCalibration } from "../results";
import { type Calibrated, fluidOf, type Run } from "./run";

/** A recorded revision as a run that can be evaluated; `only` leaves out injectors that no longer count. */
export function runOfRevision(revision: CycleRevision, only?: Set<string>): Run {
  const kept = revision.injectors.filter((injector) => !only || only.has(injector.setInjectorId));
  return {
    fluid: fluidOf(revision.fluid),
    fluidTemperatureC: revision.fluidTemperatureC.indicated,
    pressureKpa: revision.pressureKpa.indicated,
    driveVolts: revision.driveVolts.indicated,
    driverKind: revision.driverKind,
    periodMs: revision.periodMs.indicated,
    collects: revision.collects,
    repeatability: revision.repeatability,
    instruments: Object.fromEntries(
      revision.calibrations
        .filter((used) => used.channelNumber === null)
        .map((used) => [used.kind, calibrated(used)]),
    ),
    injectors: kept.map((injector) => ({
      setInjectorId: injector.setInjectorId,
      channel: channelOf(revision, injector.channelNumber),
      readings: injector.readings,
    })),
  };
}

function channelOf(revision: CycleRevision, channelNumber: number): Calibrated {
  const used = revision.calibrations.find((calibration) => calibration.channelNumber === channelNumber);
  return used ? calibrated(used) : { division: 0, rangeHigh: Number.POSITIVE_INFINITY, calibration: null };
}

function calibrated(used: UsedCalibration): Calibrated {
  return { division: used.division, rangeHigh: used.rangeHigh, calibration: used };
}
