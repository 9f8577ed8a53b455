import "server-only";
import { and, asc, eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { brokenConstraint } from "../../db/lost-connection";
import { setInjectors } from "../../db/schema/injectors";
import type { Context } from "../access/actor";
import { invalid, refused } from "../access/errors";
import { write } from "../write";
import { replaceInjectorInput } from "./injector-inputs";
import { knowInjectors } from "./know-injectors";
import { requireInjectorOnTheBench } from "./reject-injector";
import { refuseStillInASet } from "./still-in-a-set";

/** Puts another injector in the place of a rejected one, under the same tag with a letter. */
export function replaceInjector(context: Context, raw: unknown) {
  return write(
    context,
    "replaceInjector",
    replaceInjectorInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, setInjectorId, serial, ...described } = input;
      const { set, injector: rejected } = await requireInjectorOnTheBench(transaction, setInjectorId);
      const { setId, position } = rejected;
      if (rejected.state !== "rejected")
        throw refused(`${rejected.tag} is ${rejected.state}.`, ["Only a rejected injector is replaced."]);
      const tag = await nextTag(transaction, setId, position);
      await transaction
        .update(setInjectors)
        .set({ state: "replaced" })
        .where(eq(setInjectors.id, setInjectorId));
      const [injectorId] = await knowInjectors(transaction, set.modelId, [serial || null]);
      await refuseStillInASet(transaction, setId, [{ injectorId: injectorId!, serial, field: "serial" }]);
      const [added] = await transaction
        .insert(setInjectors)
        .values({ setId, injectorId: injectorId!, position, tag, ...described, replacesId: setInjectorId })
        .returning({ id: setInjectors.id })
        .catch((error: unknown) => {
          throw brokenConstraint(error) === "set_injectors_one_open_set"
            ? invalid("serial", `Serial ${serial} is in an open set already.`)
            : error;
        });
      await record({
        event: "injector replaced",
        noun: "injector",
        objectId: added!.id,
        setId,
        before: { setInjectorId, tag: rejected.tag },
        after: { setInjectorId: added!.id, tag },
      });
      return { setId, setInjectorId: added!.id, tag };
    },
  );
}

/** 26-0147/3 is followed by 26-0147/3B, that by 26-0147/3C. */
async function nextTag(transaction: Transaction, setId: string, position: number): Promise<string> {
  const inPlace = await transaction
    .select({ tag: setInjectors.tag, replacesId: setInjectors.replacesId })
    .from(setInjectors)
    .where(and(eq(setInjectors.setId, setId), eq(setInjectors.position, position)))
    .orderBy(asc(setInjectors.tag));
  const first = inPlace.find((injector) => injector.replacesId === null);
  if (!first || inPlace.length >= 26) throw refused("This place was replaced too often.");
  return first.tag + String.fromCharCode("A".charCodeAt(0) + inPlace.length);
}
