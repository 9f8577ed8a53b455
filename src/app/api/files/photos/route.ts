import { currentWriter } from "../../../../auth/current-actor";
import { answerRequest } from "../../../../data/edge/answer-request";
import { readBytes } from "../../../../data/edge/read-bytes";
import { addPhoto } from "../../../../data/photos";
import { mostPhotoBytes } from "../../../../data/photos/inputs";

/** One photo as the request's body; what it shows stands in the address, its file name in a header, since addresses end in logs. */
export function POST(request: Request) {
  return answerRequest(async () => {
    const context = await currentWriter();
    const asked = Object.fromEntries(new URL(request.url).searchParams);
    const name = nameIn(request.headers.get("x-file-name") ?? "");
    // Whoever has not signed in is refused by the verb; nothing is read for them.
    const isPerson = context.actor.kind === "person";
    const file = isPerson ? await readBytes(request, mostPhotoBytes) : new Uint8Array();
    if (!file) return tooLarge();
    return addPhoto(context, { ...asked, name, file });
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
    { type: "urn:evenrail:too-large", title: "A photo has at most 25 MB.", status: 413 },
    {
      status: 413,
      headers: { "Content-Type": "application/problem+json", "Cache-Control": "private, no-store" },
    },
  );
}
