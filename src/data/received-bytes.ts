import "server-only";
import { createHash } from "node:crypto";
import { z } from "zod";

/** A file's bytes as they came in. Their hash stands for them wherever an input is written down or compared. */
export function receivedBytes(missing: string) {
  return z.instanceof(Uint8Array, { error: missing }).transform((bytes) => {
    const sha256 = createHash("sha256").update(bytes).digest("hex");
    return { bytes, sha256, toJSON: () => sha256 };
  });
}

/** The name that a client gave a file: a label, without what could pass for a path or break a header. */
export function fileLabel(name: string, nameless: string): string {
  const label = name
    .normalize("NFC")
    .replace(/[\p{Cc}\p{Cf}\p{Cs}/\\]/gu, "")
    .trim();
  return [...label].slice(0, 200).join("") || nameless;
}
