import "server-only";
import { createHash } from "node:crypto";
import type { CertificateContent } from "./content";

/**
 * SHA-256 over the content as JSON with the keys in order, so that it is the same before and after the database, which
 * keeps keys in an order of its own.
 */
export function fingerprintContent(content: CertificateContent): string {
  return createHash("sha256").update(JSON.stringify(content, inKeyOrder)).digest("hex");
}

function inKeyOrder(_key: string, value: unknown): unknown {
  if (value === null || typeof value !== "object" || Array.isArray(value)) return value;
  const entries = Object.entries(value).sort(([one], [other]) => (one < other ? -1 : 1));
  return Object.fromEntries(entries);
}
