import type { CertificateState } from "@/db/vocabulary";

type Named = { certificateId: string; state: CertificateState };

/** A certificate that is no longer current says so before its file is handed out: `state` tells that it did. */
export function certificateFileHref({ certificateId, state }: Named, kind: "pdf" | "csv" | "json"): string {
  const address = `/api/files/certificates/${certificateId}/${kind}`;
  return state === "current" ? address : `${address}?state=${state}`;
}
