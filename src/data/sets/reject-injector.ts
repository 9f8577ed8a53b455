import "server-only";
import { and, eq, ne, sql } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { injectorRejections, setInjectors } from "../../db/schema/injectors";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { notFound, refused } from "../access/errors";
import { requireOpenSet } from "../course";
import { write } from "../write";
import { rejectInjectorInput } from "./injector-inputs";

/** Takes an injector out of the set. It stays on record, with what was measured on it, and goes home with the others. */
export function rejectInjector(context: Context, raw: unknown) {
  return write(
    context,
    "rejectInjector",
    rejectInjectorInput,
    raw,
    async ({ transaction, input, record }) => {
      const { setInjectorId, reason } = input;
      const { injector } = await requireInjectorOnTheBench(transaction, setInjectorId);
      if (injector.state !== "in set") throw refused(`${injector.tag} is ${injector.state} already.`);
      await requireOthers(transaction, injector.setId, setInjectorId);
      await transaction
        .update(setInjectors)
        .set({ state: "rejected" })
        .where(eq(setInjectors.id, setInjectorId));
      await transaction
        .insert(injectorRejections)
        .values({ setInjectorId, reason, rejectedBy: requirePerson(context).personId });
      await record({
        event: "injector rejected",
        noun: "injector",
        objectId: setInjectorId,
        setId: injector.setId,
        before: { state: "in set" },
        after: { state: "rejected", tag: injector.tag },
        reason,
      });
      return { setId: injector.setId };
    },
  );
}

/**
 * The injector with its set locked. Injectors come and go while the set is worked on, not any more when the manager looks at
 * its results.
 */
export async function requireInjectorOnTheBench(transaction: Transaction, setInjectorId: string) {
  const its = eq(setInjectors.id, setInjectorId);
  const [found] = await transaction.select({ setId: setInjectors.setId }).from(setInjectors).where(its);
  if (!found) throw notFound("injector");
  const set = await requireOpenSet(transaction, found.setId);
  if (set.stage === "in review") throw refused("The set is in review.", ["The manager sends it back first."]);
  const [injector] = await transaction.select().from(setInjectors).where(its);
  return { set, injector: injector! };
}

async function requireOthers(transaction: Transaction, setId: string, setInjectorId: string): Promise<void> {
  const [others] = await transaction
    .select({ count: sql<number>`count(*)::int` })
    .from(setInjectors)
    .where(
      and(
        eq(setInjectors.setId, setId),
        eq(setInjectors.state, "in set"),
        ne(setInjectors.id, setInjectorId),
      ),
    );
  if (others?.count === 0)
    throw refused("It is the last injector in the set.", ["Return the set uncleaned instead."]);
}
