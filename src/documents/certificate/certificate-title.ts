import "server-only";
import type { CertificateContent } from "./content";

/** One injector has nothing to match. */
export function certificateTitle({ injectors }: CertificateContent): string {
  const inSet = injectors.filter(({ state }) => state === "in set").length;
  return inSet === 1 ? "Injector certificate" : "Matched-set certificate";
}
