import type { PaperSize, StaffRole } from "../../../db/vocabulary";
import type { CertificateContent, Signature } from "../../../documents/certificate/content";
import { describeMethod, standingCautions, standingStatements } from "../../../documents/certificate/wording";
import type { CertificateBasis } from "../load-basis";
import { recordersOf } from "../recorders-of";
import type { Reviewed } from "../require-as-seen";
import { certifyRecord } from "./certify-record";
import { describeDeviations } from "./describe-deviations";
import { roleName, signTests } from "./sign";

/** What is decided at issue, beside the record itself. */
export type Issue = {
  number: string;
  revision: number;
  replaces: { number: string; reason: string } | null;
  verificationCode: string;
  programVersion: string;
  paperSize: PaperSize;
  remarks: string;
  releaser: Releaser;
};

export type Releaser = { personId: string; name: string; roles: readonly StaffRole[] };

/** The whole of what a certificate says, from the record as it stands. Pure: the same record gives the same content. */
export function buildContent(reviewed: Reviewed, basis: CertificateBasis, issue: Issue): CertificateContent {
  const recorded = certifyRecord(reviewed, basis);
  const issuedAt = basis.issuedAt.toISOString();
  const { paperSize, remarks, releaser, ...identity } = issue;
  return {
    format: 1,
    paperSize,
    certificate: { ...identity, issuedAt, verificationUrl: null, recordSha256: basis.recordSha256 },
    ...recorded,
    method: describeMethod(recorded),
    deviations: describeDeviations(reviewed, basis.lab.timeZone),
    remarks,
    externallyProvided: [],
    statements: standingStatements(recorded),
    cautions: standingCautions(),
    testedBy: signTests(reviewed.results),
    releasedBy: signRelease(releaser, issuedAt),
    onePersonTestedAndReleased: isRecorder(reviewed, releaser),
  };
}

function isRecorder({ results }: Reviewed, { personId }: Releaser): boolean {
  return recordersOf(results).some(({ recorder }) => recorder.personId === personId);
}

/** What the signature means; the release dialog shows the same words before they are signed. */
export const releaseMeaning = "reviewed the results and released this certificate";

function signRelease({ name, roles }: Releaser, at: string): Signature {
  return { name, role: roleName(roles), at, meaning: releaseMeaning };
}
