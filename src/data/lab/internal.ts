import "server-only";
import { labDetails } from "../../db/schema/lab";

export const labColumns = {
  name: labDetails.name,
  address: labDetails.address,
  phone: labDetails.phone,
  email: labDetails.email,
  accreditation: labDetails.accreditation,
  certificateWording: labDetails.certificateWording,
  timeZone: labDetails.timeZone,
  paperSize: labDetails.paperSize,
  releaserIsAnother: labDetails.releaserIsAnother,
  referenceFluid: labDetails.referenceFluid,
  referenceDensityGPerMl: labDetails.referenceDensityGPerMl,
  testPlan: labDetails.testPlan,
  version: labDetails.version,
};
