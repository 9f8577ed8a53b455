import type { Context } from "../../src/data/access/actor";
import { addToleranceClass } from "../../src/data/tolerance-classes";
import { keyed } from "./acting";

type Limits = {
  staticSpreadPercent: number;
  deadTimeRangeMs: number;
  resistanceRangeOhm: number;
  leakageLimitMm3PerMin: number;
  limits: { fromPulseWidthMs: number; spreadPercent: number }[];
};

export const roadRace: Limits = {
  staticSpreadPercent: 2,
  deadTimeRangeMs: 0.06,
  resistanceRangeOhm: 0.6,
  leakageLimitMm3PerMin: 2,
  limits: [
    { fromPulseWidthMs: 0, spreadPercent: 5 },
    { fromPulseWidthMs: 3, spreadPercent: 2.5 },
  ],
};

export async function addSomeClass(manager: Context, name = "Road race", limits: Partial<Limits> = {}) {
  const { toleranceClassId } = await addToleranceClass(manager, keyed({ name, ...roadRace, ...limits }));
  return toleranceClassId;
}
