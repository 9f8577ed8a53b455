import "server-only";

export type {
  CertificateContent,
  CertifiedCalibration,
  CertifiedChecks,
  CertifiedInjector,
  CertifiedPhase,
} from "../../documents/certificate/content";
export { releaseMeaning } from "./content/build-content";
export { type PresentedResults, presentResults } from "./content/present-results";
export { type CertificateDetail, type CertificateRevision, getCertificate } from "./get-certificate";
export { getCertificateFile } from "./get-certificate-file";
export { getDataSheet } from "./get-data-sheet";
export { type CertificateRow, listCertificates } from "./list-certificates";
export { type RecordedPart, recordersOf } from "./recorders-of";
export { reissueCertificate } from "./reissue-certificate";
export { releaseCertificate } from "./release-certificate";
export { revokeCertificate } from "./revoke-certificate";
export { seenRecords } from "./seen-records";
export { sendBackSet } from "./send-back-set";
