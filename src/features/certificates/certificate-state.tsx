import type { CertificateState } from "@/db/vocabulary";
import { StatusMark } from "@/ui/feedback/status-mark";

const kinds = { current: "pass", superseded: "due", revoked: "fail" } as const;

export function CertificateStateMark({ state }: { state: CertificateState }) {
  return <StatusMark kind={kinds[state]}>{state}</StatusMark>;
}
