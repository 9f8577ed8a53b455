import "server-only";
import { MissingGlyphError } from "../drawing/missing-glyph-error";
import { findMissingSign } from "../drawing/split-runs";
import type { CertificateContent } from "./content";

/** Every sign of every text can be drawn, or an error names the sign and the field, before anything is drawn. */
export function requirePrintable(content: CertificateContent): void {
  requireSigns(content, []);
}

function requireSigns(value: unknown, path: readonly string[]): void {
  if (typeof value === "string") {
    const sign = findMissingSign(value);
    if (sign !== null) throw new MissingGlyphError(sign, fieldName(path));
  } else if (Array.isArray(value)) {
    for (const [index, item] of value.entries())
      requireSigns(item, [...path, nameOf(item) ?? `${index + 1}`]);
  } else if (value !== null && typeof value === "object") {
    for (const [key, item] of Object.entries(value)) requireSigns(item, [...path, key]);
  }
}

/** An injector is named by its tag, a person by their name, as long as those can be printed themselves. */
function nameOf(item: unknown): string | null {
  if (item === null || typeof item !== "object") return null;
  const { tag } = item as { tag?: unknown };
  return typeof tag === "string" && findMissingSign(tag) === null ? tag : null;
}

/** customer, name → "customer name"; injectors, 26-0147/3, conditionNote → "injectors 26-0147/3 condition note". */
function fieldName(path: readonly string[]): string {
  return path
    .map((part) => part.replace(/([a-z])([A-Z])/g, (_, low, high) => `${low} ${high.toLowerCase()}`))
    .join(" ");
}
