import "server-only";
import type { Transaction } from "../../db/client";
import { setInjectors } from "../../db/schema/injectors";
import { refused } from "../access/errors";
import { refuseStillInASet, type Wanted } from "./still-in-a-set";
import type { InjectorCondition } from "./types";

type Place = Wanted & {
  position: number;
  marking: string;
  condition: InjectorCondition;
  conditionNote: string;
};

/** Puts injectors into a set, each with its tag. The index that keeps one in one open set decides under races too. */
export async function takePlaces(
  transaction: Transaction,
  set: { setId: string; number: string },
  places: Place[],
): Promise<void> {
  const taken = await transaction
    .insert(setInjectors)
    .values(
      places.map(({ serial: _serial, field: _field, ...place }) => ({
        ...place,
        setId: set.setId,
        tag: `${set.number}/${place.position}`,
      })),
    )
    .onConflictDoNothing()
    .returning({ injectorId: setInjectors.injectorId });
  if (taken.length === places.length) return;
  await refuseStillInASet(transaction, set.setId, places);
  throw refused("The set was changed by somebody else just now. Reload the page.");
}
