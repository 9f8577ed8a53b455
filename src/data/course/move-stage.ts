import "server-only";
import { and, eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { brokenConstraint } from "../../db/lost-connection";
import { setSteps, sets } from "../../db/schema/sets";
import type { Stage } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { type Refusal, refused } from "../access/errors";

type Moving = { setId: string; stage: Stage };

/** One step in the course of a set. The database refuses a step out of order; here it is said what is missing. */
export async function moveStage(
  transaction: Transaction,
  context: Context,
  set: Moving,
  to: Stage,
  reason?: string,
): Promise<void> {
  const moved = await transaction
    .update(sets)
    .set({ stage: to })
    .where(and(eq(sets.id, set.setId), eq(sets.stage, set.stage)))
    .returning({ setId: sets.id })
    .catch((error: unknown) => {
      throw stepRefused(set.stage, to, brokenConstraint(error)) ?? error;
    });
  if (moved.length === 0) throw refused(`The set is no longer ${set.stage}. Reload the page.`);
  await transaction.insert(setSteps).values({
    setId: set.setId,
    fromStage: set.stage,
    toStage: to,
    reason: reason ?? null,
    personId: requirePerson(context).personId,
  });
}

/** The first step, written with the set itself. */
export async function beginCourse(transaction: Transaction, context: Context, setId: string): Promise<void> {
  await transaction
    .insert(setSteps)
    .values({ setId, toStage: "checked in", personId: requirePerson(context).personId });
}

function stepRefused(from: Stage, to: Stage, constraint: string | undefined): Refusal | null {
  switch (constraint) {
    case "sets_stage_order":
      return refused(`A set that is ${from} cannot become ${to}.`, orderMissing(from, to));
    case "sets_stage_not_while_held":
      return refused("A set on hold keeps its stage.", ["Take it off hold first."]);
    case "sets_stage_needs_cycle":
      return refused(`The set cannot become ${to}.`, [`Record a cycle ${to} first.`]);
    case "sets_stage_needs_cleaning_run":
      return refused("The set cannot go on to cleaning.", ["Record a cleaning run first."]);
    case "sets_stage_needs_certificate":
      return from === "certified"
        ? refused("The set has no current certificate.", [
            "Its certificate was revoked: reissue it before the set is handed over.",
          ])
        : refused("The set has no current certificate.", ["Release its certificate first."]);
    case "sets_stage_needs_hand_over":
      return refused("No hand-over is recorded.", ["Say who took the set and how."]);
    default:
      return null;
  }
}

function orderMissing(from: Stage, to: Stage): string[] {
  if (to === "handed over") return ["It leaves once it is certified, or returned uncleaned with a reason."];
  if (from === "handed over") return ["It has left the lab. Check it in again when it comes back."];
  return [];
}
