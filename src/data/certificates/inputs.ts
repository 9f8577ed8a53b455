import { z } from "zod";
import { certificateStates, paperSizes } from "../../db/vocabulary";
import { baseVersion, choice, id, optionalText, page, reason, searched, writeInput } from "../fields";

/** The records that the page showed when its form was made: nothing unseen is approved. */
const seen = z.string({ error: "The form does not say what was seen. Reload the page." }).min(1).max(8000);

export const sendBackSetInput = writeInput({
  setId: id("set"),
  version: baseVersion,
  seen,
  reason: reason(),
});

const issue = {
  version: baseVersion,
  seen,
  paperSize: choice("Paper", paperSizes),
  remarks: optionalText({ label: "Remarks", longest: 2000, lines: "many" }),
};

export const releaseCertificateInput = writeInput({ setId: id("set"), ...issue });
export const reissueCertificateInput = writeInput({
  certificateId: id("certificate"),
  ...issue,
  reason: reason("Reason for the new revision"),
});
export const revokeCertificateInput = writeInput({ certificateId: id("certificate"), reason: reason() });

export const certificateSorts = ["issuedAt", "number", "set", "customer"] as const;

export const listCertificatesInput = page.extend({
  setId: z.uuid().optional().catch(undefined),
  state: z.enum(certificateStates).optional().catch(undefined),
  search: searched(),
  sort: z.enum(certificateSorts).catch("issuedAt"),
  descending: z
    .enum(["true", "false"])
    .catch("true")
    .transform((typed) => typed === "true"),
});

export const getCertificateInput = z.object({ certificateId: id("certificate") });
export const dataSheetFormats = ["csv", "json"] as const;
export const getDataSheetInput = getCertificateInput.extend({ format: z.enum(dataSheetFormats) });
