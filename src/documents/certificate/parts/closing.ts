import "server-only";
import { formatRecordInstant } from "../../../format/format-date";
import { type Block, beside, gap, nothing, stack } from "../../drawing/block";
import { words } from "../../drawing/cells";
import { line } from "../../drawing/lines";
import type { Pen } from "../../drawing/pen";
import { colours, styles } from "../../drawing/print-style";
import { qrCode } from "../../drawing/qr-code";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import { heading, paragraph } from "../../drawing/text-blocks";
import type { CertificateContent, Signature } from "../content";
import { fingerprintContent } from "../fingerprint";
import { titledText } from "./text-section";

export function signatureSections(pen: Pen, content: CertificateContent, width: number): Section[] {
  const { testedBy, releasedBy, onePersonTestedAndReleased, lab } = content;
  const rowOf = ({ name, role, at, meaning }: Signature) => ({
    cells: [
      [{ text: name, style: styles.bodyStrong }],
      words(role),
      words(meaning),
      words(formatRecordInstant(at, lab.timeZone)),
    ],
  });
  const same = `${releasedBy.name} both tested and released: the laboratory lets one person do both.`;
  return [
    ...tableSections(
      pen,
      { title: "Tested and released by", note: onePersonTestedAndReleased ? same : "" },
      {
        columns: [
          { title: ["Name"], align: "left", flex: 1 },
          { title: ["Role"], align: "left", flex: 1 },
          { title: ["What it stands for"], align: "left", flex: 2 },
          { title: ["When"], align: "left" },
        ],
        rows: [...testedBy.map(rowOf), { ...rowOf(releasedBy), rule: "strong" as const }],
      },
      width,
    ),
  ];
}

export function statementSections(pen: Pen, content: CertificateContent, width: number): Section[] {
  return [
    titledText(pen, "What this certificate says and does not say", content.statements, width),
    titledText(pen, "Caution", content.cautions, width),
  ];
}

/** How a holder tells that this paper is what was issued, and that nothing of it is missing. */
export function verificationSection(pen: Pen, content: CertificateContent, width: number): Section {
  const { certificate } = content;
  const size = 76;
  const url = certificate.verificationUrl;
  const at = url ? size + 10 : 0;
  const facts = stack(
    [
      ["Verification code", certificate.verificationCode],
      ["Fingerprint of what this certificate says (SHA-256)", fingerprintContent(content)],
      ["Newest entry of the laboratory's activity record at issue (SHA-256)", certificate.recordSha256],
      ["Made with", certificate.programVersion],
    ].map(([key, value]) =>
      stack([
        paragraph(pen, key!, width - at, styles.key),
        paragraph(pen, value!, width - at, styles.bodyStrong),
        gap(2),
      ]),
    ),
  );
  const link = url
    ? stack([paragraph(pen, "Check it at", width - at, styles.key), linked(pen, url, width - at)])
    : nothing;
  const right = stack([link, facts]);
  const body = url
    ? beside([
        { at: 0, block: qrCode(pen, url, size) },
        { at, block: right },
      ])
    : right;
  return {
    lead: heading(pen, "Verification", "", width),
    rows: [stack([body, endMark(pen, certificate.number, width)])],
  };
}

function linked(pen: Pen, url: string, width: number): Block {
  const text = paragraph(pen, url, width, { ...styles.bodyStrong, colour: colours.petrol });
  return {
    height: text.height + 2,
    draw(x, y) {
      text.draw(x, y);
      pen.doc.link(x, y, Math.min(width, pen.measure(url, styles.bodyStrong)), text.height, url);
    },
  };
}

function endMark(pen: Pen, number: string, width: number): Block {
  const text = `End of certificate ${number}`;
  return {
    height: 22,
    draw(x, y) {
      const half = pen.measure(text, styles.key) / 2 + 8;
      const middle = x + width / 2;
      line(pen, [x, y + 12], [middle - half, y + 12], { colour: colours.hair });
      line(pen, [middle + half, y + 12], [x + width, y + 12], { colour: colours.hair });
      pen.write(text, middle, y + 14.4, styles.key, "centre");
    },
  };
}
