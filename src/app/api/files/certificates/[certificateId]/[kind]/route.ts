import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { notFound } from "@/data/access/errors";
import { getCertificateFile, getDataSheet } from "@/data/certificates";
import { dataSheetFormats } from "@/data/certificates/inputs";
import { answerRequest } from "@/data/edge/answer-request";
import { fileResponse } from "@/data/edge/file-response";
import type { CertificateState } from "@/db/vocabulary";
import { settings } from "@/settings";

type Address = { params: Promise<{ certificateId: string; kind: string }> };

/** The certificate as PDF, or its numbers as CSV or JSON. One that is not current is shown as such first. */
export function GET(request: Request, { params }: Address) {
  return answerRequest(async () => {
    const { certificateId, kind } = await params;
    const context = await currentContext();
    const file = await readFile();
    const told = new URL(request.url).searchParams.get("state");
    if (file.state !== "current" && told !== file.state) return statusFirst();
    return fileResponse({ ...file, saved: true });

    async function readFile() {
      if (kind === "pdf") {
        const { number, state, bytes, mediaType } = await getCertificateFile(context, { certificateId });
        return { state, bytes, mediaType, name: `certificate ${nameOf(number, state)}.pdf` };
      }
      const format = dataSheetFormats.find((known) => known === kind);
      if (!format) throw notFound("file");
      const { number, state, text } = await getDataSheet(context, { certificateId, format });
      const mediaType = format === "csv" ? "text/csv; charset=utf-8" : "application/json";
      const bytes = new TextEncoder().encode(text);
      return { state, bytes, mediaType, name: `data sheet ${nameOf(number, state)}.${format}` };
    }

    function statusFirst(): Response {
      const isStaff = rolesOf(context.actor).some((role) => role !== "customer");
      const page = `${isStaff ? "" : "/my"}/certificates/${certificateId}`;
      return Response.redirect(new URL(page, settings().APP_ORIGIN), 303);
    }
  });
}

/** C26-0087/1 cannot be a file's name, and a file that is no longer current says so in its name. */
function nameOf(number: string, state: CertificateState): string {
  return `${number.replace("/", "-")}${state === "current" ? "" : ` (${state})`}`;
}
