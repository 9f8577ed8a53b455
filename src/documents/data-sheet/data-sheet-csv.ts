import "server-only";
import type { CertificateContent } from "../certificate/content";
import { type DataRow, dataSheetRows } from "./data-sheet-rows";

/** A row for each injector and phase, RFC 4180, UTF-8. Conditions stand in every row, so that a row can travel alone. */
export function dataSheetCsv(content: CertificateContent): string {
  const rows = dataSheetRows(content);
  const head = rows[0] ? cellsOf(content, rows[0]).map(([name]) => name) : ["certificate"];
  const lines = rows.map((row) => cellsOf(content, row).map(([, cell]) => cell));
  return [head, ...lines].map((cells) => `${cells.join(",")}\r\n`).join("");
}

function cellsOf(content: CertificateContent, { phase, injector, figures }: DataRow): [string, string][] {
  const measured = phase === "as found" ? content.asFound : content.asLeft;
  return [
    ["certificate", words(content.certificate.number)],
    ["set", words(content.set.number)],
    ["model", words(`${content.model.make} ${content.model.partNumber}`)],
    ["injector", words(injector.tag)],
    ["serial", words(injector.serial ?? "")],
    ["phase", words(phase)],
    ["measured_at", words(measured.measuredAt)],
    ["reference_pressure_kpa", String(content.reference.pressureKpa)],
    ["reference_density_g_per_ml", String(content.reference.densityGPerMl)],
    ["driver", words(measured.driverKind)],
    ...figures.map(({ name, value }): [string, string] => [name, value ?? ""]),
  ];
}

/** A text that a spreadsheet would take for a formula gets an apostrophe in front. */
function words(text: string): string {
  const plain = /^[=+\-@\t\r\0]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
}
