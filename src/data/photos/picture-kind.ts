import "server-only";
import { fileTypeFromBuffer } from "file-type";
import { invalid } from "../access/errors";

const kinds: Record<string, "jpeg" | "png" | "webp"> = {
  "image/jpeg": "jpeg",
  "image/png": "png",
  "image/webp": "webp",
};

/** Decided by what the file holds, never by its name or what the sender calls it. Nothing is decoded for it. */
export async function requirePictureKind(bytes: Uint8Array): Promise<"jpeg" | "png" | "webp"> {
  if (bytes.length === 0) throw invalid("file", "The photo is empty.");
  if (isHeif(bytes))
    throw invalid(
      "file",
      "This is a HEIC photo, which cannot be read here. Set the phone's camera to JPEG (on many phones: Formats, Most compatible), or choose the photo in the phone's browser, which converts it.",
    );
  const found = await fileTypeFromBuffer(bytes).catch(() => undefined);
  const kind = kinds[found?.mime ?? ""];
  if (!kind) throw invalid("file", "This is not a photo: JPEG, PNG and WebP pictures are kept.");
  return kind;
}

/** HEIC and its relatives name themselves in the first box of the file, also when the rest is cut off. */
function isHeif(bytes: Uint8Array): boolean {
  const head = Buffer.from(bytes.subarray(0, 64)).toString("latin1");
  return head.slice(4, 8) === "ftyp" && /hei[cfmsx]|hev[cmsx]|mif1|msf1|avif|avis/.test(head.slice(8));
}
