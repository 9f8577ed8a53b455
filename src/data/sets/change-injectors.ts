import "server-only";
import { and, eq, inArray, max } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { brokenConstraint } from "../../db/lost-connection";
import { injectorRejections, injectors, setInjectors } from "../../db/schema/injectors";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { invalid, refused } from "../access/errors";
import type { LockedSet } from "../course";
import { type editIntakeInput, mostInjectors, sameSerial } from "./inputs";
import { knowInjectors } from "./know-injectors";
import { refuseStillInASet } from "./still-in-a-set";
import { takePlaces } from "./take-places";

type Intake = z.output<typeof editIntakeInput>;
type Typed = Intake["injectors"][number] & { field: string };
type Stored = { setInjectorId: string; injectorId: string; serial: string | null };

/** Corrects the injectors of a set. One that was booked in but never arrived stays on record as rejected. */
export async function changeInjectors(
  transaction: Transaction,
  context: Context,
  set: LockedSet,
  intake: Intake,
): Promise<void> {
  const stored = await transaction
    .select({ setInjectorId: setInjectors.id, injectorId: setInjectors.injectorId, serial: injectors.serial })
    .from(setInjectors)
    .innerJoin(injectors, eq(injectors.id, setInjectors.injectorId))
    .where(and(eq(setInjectors.setId, set.setId), eq(setInjectors.state, "in set")));
  requireAllNamed(stored, intake);
  const typed = intake.injectors.map((row, at) => ({ ...row, field: `injectors[${at}].serial` }));
  await rejectMissing(transaction, context, typed);
  const arrived = await withInjectors(transaction, set, intake.modelId, typed, stored);
  await refuseStillInASet(transaction, set.setId, arrived);
  await changePlaces(transaction, arrived);
  const found = arrived.filter((row) => !row.setInjectorId);
  if (found.length > 0) await addFound(transaction, set, found);
}

function requireAllNamed(stored: Stored[], intake: Intake): void {
  const named = new Set(intake.injectors.flatMap((row) => row.setInjectorId ?? []));
  if (named.size !== stored.length || stored.some((row) => !named.has(row.setInjectorId)))
    throw refused("The injectors of this set have changed. Reload the page.");
  if (intake.injectors.every((row) => row.notReceived))
    throw refused("A set has at least one injector.", ["Return the set uncleaned if nothing arrived."]);
}

/** An injector whose model and serial stay the same stays itself, also without a serial. */
async function withInjectors(
  transaction: Transaction,
  set: LockedSet,
  modelId: string,
  typed: Typed[],
  stored: Stored[],
) {
  const itself = (row: Typed) => {
    const before = stored.find((each) => each.setInjectorId === row.setInjectorId);
    const same = before && set.modelId === modelId && sameSerial(before.serial ?? "", row.serial ?? "");
    return same ? before.injectorId : undefined;
  };
  const arrived = typed.filter((row) => !row.notReceived);
  const others = arrived.filter((row) => !itself(row));
  const known = await knowInjectors(
    transaction,
    modelId,
    others.map((row) => row.serial),
  );
  return arrived.map((row) => ({ ...row, injectorId: itself(row) ?? known[others.indexOf(row)]! }));
}

type Arrived = Awaited<ReturnType<typeof withInjectors>>;

async function changePlaces(transaction: Transaction, arrived: Arrived): Promise<void> {
  const changed = arrived.flatMap(({ setInjectorId, ...row }) =>
    setInjectorId ? [{ ...row, setInjectorId }] : [],
  );
  // Two injectors may have changed places: none is in house while they are put down anew.
  await transaction
    .update(setInjectors)
    .set({ inHouse: false })
    .where(
      inArray(
        setInjectors.id,
        changed.map((row) => row.setInjectorId),
      ),
    );
  for (const { setInjectorId, field, serial, injectorId, marking, condition, conditionNote } of changed)
    await transaction
      .update(setInjectors)
      .set({ injectorId, marking, condition, conditionNote, inHouse: true })
      .where(eq(setInjectors.id, setInjectorId))
      .catch((error: unknown) => {
        if (brokenConstraint(error) !== "set_injectors_one_open_set") throw error;
        throw invalid(field, `${serial} has been booked into another set just now.`);
      });
}

async function rejectMissing(transaction: Transaction, context: Context, typed: Typed[]): Promise<void> {
  const missing = typed.flatMap((row) => (row.notReceived && row.setInjectorId ? [row.setInjectorId] : []));
  if (missing.length === 0) return;
  await transaction
    .update(setInjectors)
    .set({ state: "rejected", inHouse: false })
    .where(inArray(setInjectors.id, missing));
  const rejectedBy = requirePerson(context).personId;
  await transaction
    .insert(injectorRejections)
    .values(missing.map((setInjectorId) => ({ setInjectorId, reason: "Not in the parcel", rejectedBy })));
}

async function addFound(transaction: Transaction, set: LockedSet, found: Arrived): Promise<void> {
  const [last] = await transaction
    .select({ position: max(setInjectors.position) })
    .from(setInjectors)
    .where(eq(setInjectors.setId, set.setId));
  const first = (last?.position ?? 0) + 1;
  if (first + found.length - 1 > mostInjectors) throw refused(`A set has at most ${mostInjectors} places.`);
  await takePlaces(
    transaction,
    set,
    found.map((row, at) => ({ ...row, position: first + at })),
  );
}
