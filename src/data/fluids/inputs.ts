import { z } from "zod";
import { decimal, id, text, tick, writeInput } from "../fields";

export const addFluidInput = writeInput({
  name: text({ label: "Fluid's name", longest: 80 }),
  densityAt15GPerMl: decimal({
    label: "Density at 15 °C",
    low: 0.4,
    high: 1.2,
    decimals: 6,
    unit: "g/mL",
  }),
  expansionPerK: decimal({ label: "Expansion", low: 0, high: 0.01, decimals: 8, unit: "per K" }),
  source: text({ label: "Source", longest: 300 }),
});
export const setFluidRetiredInput = writeInput({ fluidId: id("fluid"), retired: tick() });
export const listFluidsInput = z
  .object({ withRetired: z.boolean().catch(false) })
  .nullish()
  .transform((typed) => typed ?? { withRetired: false });
