import type { Context } from "../../src/data/access/actor";
import { addModel } from "../../src/data/models";
import type { ModelValues } from "../../src/data/models/inputs";
import { keyed } from "./acting";

export const kestrel: ModelValues = {
  make: "Kestrel",
  partNumber: "KX-440",
  impedanceBand: "high impedance",
  resistanceLowOhm: 11.4,
  resistanceHighOhm: 12.6,
  ratedFlowMlPerMin: 440,
  ratedFlowBandPercent: 4,
  ratedPressureKpa: 300,
  leakageLimitMm3PerMin: 2,
  leakagePressureKpa: 300,
  sprayType: "cone",
};

export async function addSomeModel(manager: Context, values: Partial<ModelValues> = {}): Promise<string> {
  const { modelId } = await addModel(manager, keyed({ ...kestrel, ...values }));
  return modelId;
}
