import "server-only";
import type { Context } from "../access/actor";
import { read } from "../read";
import { getSet } from "./get-set";
import { getSetInput } from "./inputs";

/** What stands on the labels of a set's bags and its box. */
export function getBagLabels(context: Context, raw: unknown) {
  return read(context, "getBagLabels", getSetInput, raw, async ({ input }) => getSet(context, input));
}
