import type {
  CertifiedClass,
  CertifiedInjector,
  CertifiedModel,
  CertifiedPhase,
} from "../../../documents/certificate/content";
import type { SetResults } from "../../cycles/results";
import type { SetDetail } from "../../sets";
import { certifyInjectors } from "./certify-injectors";
import { certifyPhase } from "./certify-phase";

/** A set's results in the certificate's own terms; a phase that is not measured yet is null. */
export type PresentedResults = {
  model: CertifiedModel;
  injectors: CertifiedInjector[];
  reference: { pressureKpa: number; densityGPerMl: number; fluid: string };
  toleranceClass: CertifiedClass;
  asFound: CertifiedPhase | null;
  asLeft: CertifiedPhase | null;
};

/** The set page, the certificate and the data sheets all show what this makes. */
export function presentResults(set: SetDetail, results: SetResults): PresentedResults {
  const { modelId: _model, confirmed: _confirmed, ...model } = set.model;
  const { toleranceClassId: _class, toleranceClassRevisionId: _revision, ...judged } = results.toleranceClass;
  return {
    model,
    injectors: certifyInjectors(set.injectors),
    reference: results.reference,
    toleranceClass: { ...judged, leakageLimitMm3PerMin: results.leakageLimitMm3PerMin },
    asFound: results.asFound && certifyPhase(results.asFound),
    asLeft: results.asLeft && certifyPhase(results.asLeft),
  };
}
