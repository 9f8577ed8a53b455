import "server-only";
import { MissingGlyphError } from "../../documents/drawing/missing-glyph-error";
import { renderLabels } from "../../documents/labels/render-labels";
import { settings } from "../../settings";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { getLabCard } from "../lab";
import { read } from "../read";
import { getSet } from "./get-set";
import { getBagLabelsInput } from "./inputs";
import type { SetDetail } from "./types";

/** The labels of a set's bags as a PDF: one for each injector that is in the parcel. */
export function getBagLabels(context: Context, raw: unknown) {
  return read(context, "getBagLabels", getBagLabelsInput, raw, async ({ input: { setId, size } }) => {
    const set = await getSet(context, { setId });
    const lab = await getLabCard(context);
    const content = {
      title: `Labels of set ${set.number}`,
      lab: lab.name,
      madeAt: set.checkedInAt.toISOString(),
      program: "Evenrail",
      address: `${settings().APP_ORIGIN}/sets/${setId}`,
      labels: labelsOf(set),
    };
    const bytes = await renderLabels(content, size).catch((error: unknown) => {
      throw error instanceof MissingGlyphError
        ? refused("The labels cannot be printed.", [error.message])
        : error;
    });
    return { number: set.number, bytes };
  });
}

function labelsOf({ injectors, customer, model }: SetDetail) {
  return injectors
    .filter(({ state }) => state !== "replaced")
    .map(({ tag, serial, marking }) => ({
      tag,
      lines: [
        [serial, marking].filter(Boolean).join(", "),
        `${model.make} ${model.partNumber}`,
        customer.name,
      ].filter(Boolean),
    }));
}
