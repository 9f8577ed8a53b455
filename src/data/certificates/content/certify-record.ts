import type {
  CertificateContent,
  CertifiedCleaning,
  LabIdentity,
} from "../../../documents/certificate/content";
import type { CleaningRun } from "../../cycles/results";
import type { SetDetail } from "../../sets";
import type { CertificateBasis } from "../load-basis";
import type { Reviewed } from "../require-as-seen";
import { presentResults } from "./present-results";

/** What stands in the record, whoever releases it and when. */
export function certifyRecord({ set, results }: Reviewed, basis: CertificateBasis) {
  const presented = presentResults(set, results);
  return {
    ...presented,
    asFound: presented.asFound!,
    asLeft: presented.asLeft!,
    lab: labIdentity(basis.lab, results.asLeft.latest.bench.location),
    customer: basis.customer,
    suppliedByCustomer: suppliedByCustomer(set),
    set: { number: set.number, workAsked: set.workAsked, receivedAt: set.checkedInAt.toISOString() },
    cleaningRuns: results.cleaningRuns.map(certifyCleaning),
    photos: basis.sprayPhotos.map(({ sha256, setInjectorId, phase, takenAt }) => ({
      sha256,
      injectorId: setInjectorId,
      phase,
      takenAt: takenAt.toISOString(),
    })),
  };
}

function labIdentity(lab: CertificateBasis["lab"], room: string): LabIdentity {
  const { name, address, phone, email, timeZone, accreditation, certificateWording } = lab;
  const placeOfWork = [name, room].filter((part) => part !== "").join(", ");
  return { name, address, phone, email, timeZone, accreditation, wording: certificateWording, placeOfWork };
}

function suppliedByCustomer({
  customerRequest,
  injectors,
}: SetDetail): CertificateContent["suppliedByCustomer"] {
  const markings = injectors
    .filter(({ marking }) => marking !== "")
    .map(({ tag, marking }) => `${tag}: ${marking}`);
  return [
    { label: "Request", text: customerRequest },
    { label: "Markings", text: markings.join(", ") },
  ].filter(({ text }) => text !== "");
}

function certifyCleaning(run: CleaningRun): CertifiedCleaning {
  const { bath, detergentBatch, minutes, temperatureC, backFlushed, partsRenewed } = run;
  return {
    recordedAt: run.recordedAt.toISOString(),
    recordedBy: run.recordedBy.name,
    bath,
    detergentBatch,
    minutes,
    temperatureC,
    backFlushed,
    partsRenewed,
  };
}
