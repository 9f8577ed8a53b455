import type { Context } from "../../src/data/access/actor";
import { addCalibratedBench, type CalibratedBench } from "../factories/benches";
import { dayOf, daysAfter } from "../timeline";

export type DemoBench = CalibratedBench & {
  /** Null for a bench whose calibration has run out. */
  recalibratedDaysAgo: number | null;
};

/** Two benches with graduated cylinders in daily use, and one with balances whose calibration ran out. */
export async function addBenches(manager: Context, fluidId: string, begin: Date): Promise<DemoBench[]> {
  const validFrom = dayOf(begin);
  const yearLater = dayOf(daysAfter(begin, 365));
  const channels = 8;
  return [
    {
      ...(await addCalibratedBench(manager, {
        code: "B1",
        location: "Window side",
        fluidId,
        validFrom,
        validUntil: yearLater,
        channels,
      })),
      recalibratedDaysAgo: 74,
    },
    {
      ...(await addCalibratedBench(manager, {
        code: "B2",
        location: "Wall side",
        fluidId,
        validFrom,
        validUntil: yearLater,
        channels,
      })),
      recalibratedDaysAgo: 71,
    },
    {
      ...(await addCalibratedBench(manager, {
        code: "B3",
        location: "Back room",
        fluidId,
        collects: "mass",
        validFrom,
        validUntil: dayOf(daysAfter(begin, 418)),
        channels: 4,
      })),
      recalibratedDaysAgo: null,
    },
  ];
}
