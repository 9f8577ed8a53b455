import type { Condition } from "../results";

type Instrument = {
  division: number;
  calibration: { gain: number; offset: number; gainU: number; offsetU: number } | null;
};

/**
 * What is true when an instrument shows `indicated`: gain · indicated + offset of its calibration. The standard
 * uncertainty joins those of gain and offset and the resolution (division/√12). Without an instrument the value stands.
 */
export function conditionOf(instrument: Instrument | undefined, indicated: number): Condition {
  if (!instrument?.calibration) return { indicated, value: indicated, standardUncertainty: 0 };
  const { gain, offset, gainU, offsetU } = instrument.calibration;
  return {
    indicated,
    value: gain * indicated + offset,
    standardUncertainty: Math.hypot(offsetU, indicated * gainU, instrument.division / Math.sqrt(12)),
  };
}
