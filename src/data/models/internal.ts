import "server-only";
import { sql } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { brokenConstraint } from "../../db/lost-connection";
import { injectorModels } from "../../db/schema/models";
import { invalid } from "../access/errors";
import type { ModelValues } from "./inputs";

/** What is shown of a model, wherever it is shown. */
export const modelColumns = {
  modelId: injectorModels.id,
  make: injectorModels.make,
  partNumber: injectorModels.partNumber,
  impedanceBand: injectorModels.impedanceBand,
  resistanceLowOhm: injectorModels.resistanceLowOhm,
  resistanceHighOhm: injectorModels.resistanceHighOhm,
  ratedFlowMlPerMin: injectorModels.ratedFlowMlPerMin,
  ratedFlowBandPercent: injectorModels.ratedFlowBandPercent,
  ratedPressureKpa: injectorModels.ratedPressureKpa,
  leakageLimitMm3PerMin: injectorModels.leakageLimitMm3PerMin,
  leakagePressureKpa: injectorModels.leakagePressureKpa,
  sprayType: injectorModels.sprayType,
  confirmed: sql<boolean>`${injectorModels.confirmedAt} is not null`,
};

export const modelName = sql<string>`lower(${injectorModels.make} || ' ' || ${injectorModels.partNumber})`;

/**
 * Adds a model within another verb's transaction too: check-in enters new ones on the spot, and those wait for the
 * manager's look. `prefix` is where the form has the model's fields.
 */
export async function insertModel(
  transaction: Transaction,
  values: ModelValues,
  { confirmed, prefix = "" }: { confirmed: boolean; prefix?: string },
): Promise<string> {
  const [added] = await transaction
    .insert(injectorModels)
    .values({ ...values, confirmedAt: confirmed ? sql`record_now()` : null })
    .returning({ id: injectorModels.id })
    .catch(refuseSecondOfName(values, prefix));
  return added!.id;
}

export function refuseSecondOfName({ make, partNumber }: ModelValues, prefix = "") {
  return (error: unknown): never => {
    if (brokenConstraint(error) === "injector_models_one_per_part_number")
      throw invalid(`${prefix}partNumber`, `There is already a model ${make} ${partNumber}.`);
    throw error;
  };
}
