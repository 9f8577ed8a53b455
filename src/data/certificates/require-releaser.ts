import "server-only";
import type { Transaction } from "../../db/client";
import { labDetails } from "../../db/schema/lab";
import type { StaffRole } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import type { Releaser } from "./content/build-content";
import { recordersOf } from "./recorders-of";
import type { Reviewed } from "./require-as-seen";

/** Who signs: somebody who recorded none of the set's results, unless the lab lets one person test and release. */
export async function requireReleaser(
  transaction: Transaction,
  context: Context,
  { results }: Reviewed,
): Promise<Releaser> {
  const { personId, name, roles } = requirePerson(context);
  const [lab] = await transaction.select({ isAnother: labDetails.releaserIsAnother }).from(labDetails);
  const own = recordersOf(results).find(({ recorder }) => recorder.personId === personId);
  if (lab!.isAnother && own)
    throw refused("You recorded part of these results: somebody else releases them.", [
      `Recorded by you: ${own.parts.join(", ")}`,
    ]);
  return { personId, name, roles: roles.filter((role): role is StaffRole => role !== "customer") };
}
