import "server-only";
import { asc, eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { injectors, setInjectors } from "../../db/schema/injectors";
import { injectorModels } from "../../db/schema/models";
import { toleranceClasses } from "../../db/schema/tolerance-classes";
import type { LockedSet } from "../course";
import type { editIntakeInput } from "./inputs";

type Intake = {
  modelId: string;
  toleranceClassId: string;
  workAsked: string[];
  promisedOn: string;
  customerRequest: string;
  internalNote: string;
};
type InjectorFacts = { serial: string | null; marking: string; condition: string; conditionNote: string };

/** Intake data as a person reads them: for a conflict's two values and for the activity record. */
export async function intakeOnRecord(
  transaction: Transaction,
  set: LockedSet,
): Promise<Record<string, string>> {
  const rows = await transaction
    .select({
      serial: injectors.serial,
      marking: setInjectors.marking,
      condition: setInjectors.condition,
      conditionNote: setInjectors.conditionNote,
      state: setInjectors.state,
    })
    .from(setInjectors)
    .innerJoin(injectors, eq(injectors.id, setInjectors.injectorId))
    .where(eq(setInjectors.setId, set.setId))
    .orderBy(asc(setInjectors.position), asc(setInjectors.tag));
  return {
    ...(await askedTexts(transaction, set)),
    ...injectorTexts(rows.filter((row) => row.state === "in set")),
  };
}

export async function intakeTyped(
  transaction: Transaction,
  input: z.output<typeof editIntakeInput>,
): Promise<Record<string, string>> {
  return {
    ...(await askedTexts(transaction, input)),
    ...injectorTexts(input.injectors.map((row) => (row.notReceived ? null : row))),
  };
}

export function intakeLabels(injectorCount: number): Record<string, string> {
  const labels: Record<string, string> = {
    modelId: "Injector model",
    toleranceClassId: "Tolerance class",
    workAsked: "Work asked for",
    promisedOn: "Promised day",
    customerRequest: "Customer's request",
    internalNote: "Internal note",
  };
  for (let at = 0; at < injectorCount; at++) labels[`injectors[${at}]`] = `Injector ${at + 1}`;
  return labels;
}

async function askedTexts(transaction: Transaction, intake: Intake): Promise<Record<string, string>> {
  const [model] = await transaction
    .select({ name: sql<string>`${injectorModels.make} || ' ' || ${injectorModels.partNumber}` })
    .from(injectorModels)
    .where(eq(injectorModels.id, intake.modelId));
  const [toleranceClass] = await transaction
    .select({ name: toleranceClasses.name })
    .from(toleranceClasses)
    .where(eq(toleranceClasses.id, intake.toleranceClassId));
  return {
    modelId: model?.name ?? "unknown",
    toleranceClassId: toleranceClass?.name ?? "unknown",
    workAsked: intake.workAsked.join(", "),
    promisedOn: intake.promisedOn,
    customerRequest: intake.customerRequest,
    internalNote: intake.internalNote,
  };
}

function injectorTexts(rows: (InjectorFacts | null)[]): Record<string, string> {
  return Object.fromEntries(
    rows.map((row, at) => [
      `injectors[${at}]`,
      row
        ? [row.serial ?? "no serial", row.marking, row.condition, row.conditionNote]
            .filter(Boolean)
            .join(" · ")
        : "not in the parcel",
    ]),
  );
}
