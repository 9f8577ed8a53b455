import { requireFinite, requireNumber } from "../limits";
import { readingResolution } from "../uncertainty/reading-resolution";
import { dutyPercent } from "../units/duty-percent";
import { heldOpenMlPerMin } from "../units/held-open-ml-per-min";
import { volumePerPulseUl } from "../units/volume-per-pulse-ul";
import type { Conversion } from "./convert-conditions";
import type { CycleChannel, CycleConditions, DynamicReading, HeldOpenReading } from "./types";

/** A flow at reference conditions with what is its injector's own, all in the flow's unit. */
export type OwnFlow = {
  flow: number;
  /** Standard uncertainties of this one reading. */
  repeatability: number;
  resolution: number;
  /** Change of the flow per unit of the channel's gain and offset, which all readings of the channel share. */
  perGain: number;
  perOffset: number;
};

/** µL per pulse. */
export type PulseFlow = OwnFlow & { pulseWidthMs: number; pulseCount: number; dutyPercent: number };

type Beside = { conditions: CycleConditions; conversion: Conversion; channel: CycleChannel };

/** @throws RangeError naming the part of the reading that cannot be computed with. */
export function convertDynamic(reading: DynamicReading, beside: Beside): PulseFlow {
  const { pulseWidthMs, pulseCount } = reading;
  const duty = dutyPercent(pulseWidthMs, beside.conditions.periodMs);
  const perMl = volumePerPulseUl(1, pulseCount) * beside.conversion.dynamicFactor;
  return { pulseWidthMs, pulseCount, dutyPercent: duty, ...ownFlow(reading.amount, perMl, beside) };
}

/** mL/min. @throws RangeError naming the part of the reading that cannot be computed with. */
export function convertHeldOpen({ amount, openSeconds }: HeldOpenReading, beside: Beside): OwnFlow {
  return ownFlow(amount, heldOpenMlPerMin(1, openSeconds) * beside.conversion.staticFactor, beside);
}

function ownFlow(amount: number, perMl: number, { conditions, conversion, channel }: Beside): OwnFlow {
  requireNumber("amount", amount);
  const { gain, offset } = checked(channel).calibration;
  const perAmount = perMl * conversion.mlPerAmount;
  return {
    flow: requireFinite("amount", perAmount * (gain * amount + offset)),
    repeatability: perAmount * conditions.repeatability,
    resolution: perAmount * gain * readingResolution(channel.division),
    perGain: perAmount * amount,
    perOffset: perAmount,
  };
}

function checked(channel: CycleChannel): CycleChannel {
  const { gain, offset, gainU, offsetU } = channel.calibration;
  requireNumber("calibration.gain", gain, { above: 0 });
  requireNumber("calibration.offset", offset);
  requireNumber("calibration.gainU", gainU, { from: 0 });
  requireNumber("calibration.offsetU", offsetU, { from: 0 });
  return channel;
}
