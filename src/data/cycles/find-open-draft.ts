import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cycleDrafts } from "../../db/schema/cycles";
import type { Phase } from "../../db/vocabulary";
import { refused } from "../access/errors";

/** A phase of a set has one open sheet: this finds it when it serves the same purpose, and refuses when it does not. */
export async function findOpenDraft(
  transaction: Transaction,
  setId: string,
  phase: Phase,
  correctsCycleId: string | null,
): Promise<string | null> {
  const [open] = await transaction
    .select({ id: cycleDrafts.id, correctsCycleId: cycleDrafts.correctsCycleId })
    .from(cycleDrafts)
    .where(and(eq(cycleDrafts.setId, setId), eq(cycleDrafts.phase, phase), isNull(cycleDrafts.closedAt)));
  if (!open) return null;
  if (open.correctsCycleId === correctsCycleId) return open.id;
  throw refused(
    open.correctsCycleId
      ? `A correction of a cycle ${phase} is open.`
      : `A sheet for another cycle ${phase} is open.`,
    ["Record it or put it away first."],
  );
}
