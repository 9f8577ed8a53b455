import { currentWriter } from "../../../../auth/current-actor";
import { addReadingFile, previewReadingFile } from "../../../../data/cycles";
import { answerRequest } from "../../../../data/edge/answer-request";
import { readBytes } from "../../../../data/edge/read-bytes";

const mostBytes = 10 * 1024 * 1024;

/**
 * A file of readings as the request's body; its name comes in a header, since a name in an address ends in logs. Without an
 * idempotency key it is looked at only.
 */
export function POST(request: Request) {
  return answerRequest(async () => {
    const context = await currentWriter();
    const asked = Object.fromEntries(new URL(request.url).searchParams);
    // Who may not send a file is refused by the verb; nothing is read for them.
    const isPerson = context.actor.kind === "person";
    const bytes = isPerson ? await readBytes(request, mostBytes) : new Uint8Array();
    if (!bytes) return tooLarge();
    const input = {
      ...asked,
      name: nameIn(request.headers.get("x-file-name") ?? ""),
      format: { separator: asked.separator, decimalMark: asked.decimalMark },
      file: bytes,
    };
    return "idempotencyKey" in asked ? addReadingFile(context, input) : previewReadingFile(context, input);
  });
}

function nameIn(header: string): string {
  try {
    return decodeURIComponent(header);
  } catch {
    return header;
  }
}

function tooLarge(): Response {
  return Response.json(
    { type: "urn:evenrail:too-large", title: "A file of readings has at most 10 MB.", status: 413 },
    { status: 413, headers: { "Content-Type": "application/problem+json", "Cache-Control": "no-store" } },
  );
}
