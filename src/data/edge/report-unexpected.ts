import "server-only";
import { randomUUID } from "node:crypto";

/** The log gets the cause under an id, the person gets the id alone. */
export function reportUnexpected(error: unknown): string {
  const reference = randomUUID().slice(0, 8);
  console.error(`unexpected ${reference}`, error);
  return reference;
}
