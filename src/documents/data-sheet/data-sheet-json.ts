import "server-only";
import type { CertificateContent } from "../certificate/content";
import { dataSheetRows } from "./data-sheet-rows";

/** The same figures as the CSV, as JSON numbers with the unit in their names; null where there is no figure. */
export function dataSheetJson(content: CertificateContent): string {
  const sheet = {
    format: "evenrail data sheet",
    version: 1,
    certificate: content.certificate.number,
    revision: content.certificate.revision,
    issuedAt: content.certificate.issuedAt,
    lab: content.lab.name,
    set: content.set.number,
    model: `${content.model.make} ${content.model.partNumber}`,
    reference: {
      pressure_kpa: content.reference.pressureKpa,
      density_g_per_ml: content.reference.densityGPerMl,
      fluid: content.reference.fluid,
    },
    injectors: dataSheetRows(content).map(({ phase, injector, figures }) => ({
      injector: injector.tag,
      serial: injector.serial,
      phase,
      ...Object.fromEntries(figures.map(({ name, value }) => [name, value === null ? null : Number(value)])),
    })),
  };
  return `${JSON.stringify(sheet, null, 2)}\n`;
}
