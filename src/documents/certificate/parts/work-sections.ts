import "server-only";
import { formatRecordDayOf } from "../../../format/format-date";
import { formatQuantity } from "../../../format/format-number";
import { joinWords } from "../../../format/join-words";
import { words } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { CertificateContent } from "../content";
import { quotedText, titledText } from "./text-section";

export function cleaningTable(pen: Pen, content: CertificateContent, width: number): Section[] {
  if (content.cleaningRuns.length === 0) return [];
  return tableSections(
    pen,
    { title: "Cleaning" },
    {
      columns: [
        { title: ["Day"], align: "left" },
        { title: ["Bath"], align: "left", flex: 1 },
        { title: ["Detergent batch"], align: "left", flex: 1 },
        { title: ["For"], align: "right" },
        { title: ["At"], align: "right" },
        { title: ["Back-flushed"], align: "left" },
        { title: ["Parts renewed"], align: "left", flex: 1.6 },
        { title: ["By"], align: "left", flex: 1 },
      ],
      rows: content.cleaningRuns.map((run) => ({
        cells: [
          words(formatRecordDayOf(run.recordedAt, content.lab.timeZone)),
          words(run.bath),
          words(run.detergentBatch),
          words(formatQuantity(run.minutes, "minutes")),
          words(formatQuantity(run.temperatureC, "temperature")),
          words(run.backFlushed ? "yes" : "no"),
          words(run.partsRenewed.length > 0 ? joinWords(run.partsRenewed) : "none"),
          words(run.recordedBy),
        ],
      })),
    },
    width,
  );
}

export function methodSections(pen: Pen, content: CertificateContent, width: number): Section[] {
  const { method, deviations, remarks, externallyProvided, suppliedByCustomer, lab } = content;
  const none = "None.";
  return [
    ...(suppliedByCustomer.length > 0
      ? [
          quotedText(
            pen,
            {
              title: "Supplied by the customer",
              note: "in the customer's words, not verified by the laboratory",
            },
            suppliedByCustomer,
            width,
          ),
        ]
      : []),
    titledText(pen, "Method", method, width),
    titledText(pen, "Deviations and notes", deviations.length > 0 ? deviations : [none], width),
    ...(remarks === ""
      ? []
      : [
          quotedText(
            pen,
            { title: "Remarks", note: "of the person who released" },
            [{ label: content.releasedBy.name, text: remarks }],
            width,
          ),
        ]),
    titledText(
      pen,
      "Results from others",
      externallyProvided.length > 0 ? externallyProvided : ["None: all results are the laboratory's own."],
      width,
    ),
    ...(lab.wording === "" ? [] : [titledText(pen, "From the laboratory", [lab.wording], width)]),
  ];
}
