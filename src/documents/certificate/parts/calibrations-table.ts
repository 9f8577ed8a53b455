import "server-only";
import { formatRecordDayOf } from "../../../format/format-date";
import { noFigure } from "../../../format/format-number";
import { words } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import { styles } from "../../drawing/print-style";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { CertificateContent, CertifiedCalibration } from "../content";
import { phaseNames, phasesOf } from "../reading-content";

type Used = CertifiedCalibration & { phases: string[] };

/** Every instrument that a figure rests on, with the certificate of its calibration. */
export function calibrationsTable(pen: Pen, content: CertificateContent, width: number): Section[] {
  const day = (instant: string) => formatRecordDayOf(instant, content.lab.timeZone);
  return tableSections(
    pen,
    { title: "Instruments and their calibration", note: "in force when the set was measured" },
    {
      columns: [
        { title: ["Instrument"], align: "left" },
        { title: ["Kind"], align: "left", flex: 1 },
        { title: ["Channel"], align: "right" },
        { title: ["Calibration"], align: "left", flex: 2 },
        { title: ["From"], align: "left" },
        { title: ["Due"], align: "left" },
        { title: ["Used"], align: "left" },
      ],
      rows: usedCalibrations(content).map((used) => ({
        cells: [
          [{ text: used.instrumentCode, style: styles.bodyStrong }],
          words(used.kind),
          words(used.channelNumber === null ? noFigure : String(used.channelNumber)),
          words(used.reference),
          words(day(used.validFrom)),
          words(day(used.validUntil)),
          words(used.phases.join(", ")),
        ],
      })),
    },
    width,
  );
}

function usedCalibrations(content: CertificateContent): Used[] {
  const byIdentity = new Map<string, Used>();
  for (const [index, { calibrations }] of phasesOf(content).entries())
    for (const calibration of calibrations) {
      const key = [calibration.instrumentCode, calibration.reference, calibration.channelNumber].join("\n");
      const known = byIdentity.get(key);
      if (known) known.phases.push(phaseNames[index]!);
      else byIdentity.set(key, { ...calibration, phases: [phaseNames[index]!] });
    }
  return [...byIdentity.values()];
}
