import "server-only";
import type { CertificateContent } from "../../documents/certificate/content";
import { dataSheetCsv } from "../../documents/data-sheet/data-sheet-csv";
import { dataSheetJson } from "../../documents/data-sheet/data-sheet-json";
import type { Context } from "../access/actor";
import { read } from "../read";
import { getDataSheetInput } from "./inputs";
import { requireCertificate } from "./internal";

const writers = { csv: dataSheetCsv, json: dataSheetJson };

/** The certificate's numbers as a file, written from its stored content. */
export function getDataSheet(context: Context, raw: unknown) {
  return read(context, "getDataSheet", getDataSheetInput, raw, async ({ connection, input, grant }) => {
    const { number, state, content } = await requireCertificate(connection, input.certificateId, grant);
    return { number, state, text: writers[input.format](content as CertificateContent) };
  });
}
