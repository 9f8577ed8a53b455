import "server-only";
import { formatRecordDayOf } from "../../../format/format-date";
import { type Block, beside, gap, stack } from "../../drawing/block";
import { box, line } from "../../drawing/lines";
import type { Pen } from "../../drawing/pen";
import { colours, styles } from "../../drawing/print-style";
import { drawProductMark } from "../../drawing/product-mark";
import { paragraph } from "../../drawing/text-blocks";
import { certificateTitle } from "../certificate-title";
import type { CertificateContent } from "../content";

/** Who certifies, at the left; what this paper is, at the right. */
export function headOf(pen: Pen, content: CertificateContent, width: number): Block {
  const { lab, certificate } = content;
  const half = width * 0.52;
  const rest = width - half - 16;
  const issued = `Revision ${certificate.revision}, issued ${formatRecordDayOf(certificate.issuedAt, lab.timeZone)}`;
  const left = stack([
    paragraph(pen, lab.name, half - 34, styles.number),
    gap(2),
    ...[lab.address, [lab.phone, lab.email].filter((part) => part !== "").join(", "), lab.accreditation]
      .filter((text) => text !== "")
      .map((text) => paragraph(pen, text, half - 34, styles.note)),
  ]);
  const right = stack([
    paragraph(pen, certificateTitle(content), rest, styles.title),
    gap(1),
    paragraph(pen, certificate.number, rest, styles.number),
    gap(2),
    paragraph(pen, issued, rest, styles.note),
  ]);
  const columns = beside([
    { at: 34, block: left },
    { at: half + 16, block: right },
  ]);
  return {
    height: columns.height + 10,
    draw(x, y) {
      drawProductMark(pen, x, y + 2, 24);
      columns.draw(x, y);
      line(pen, [x, y + columns.height + 6], [x + width, y + columns.height + 6], {
        colour: colours.ink,
        width: 1,
      });
    },
  };
}

/** Says what this certificate takes the place of, and why. */
export function replacementNotice(pen: Pen, { certificate }: CertificateContent, width: number): Block[] {
  if (!certificate.replaces) return [];
  const { number, reason } = certificate.replaces;
  const text = stack([
    paragraph(
      pen,
      `This certificate replaces ${number}, which is no longer current. Reason:`,
      width - 20,
      styles.bodyStrong,
    ),
    paragraph(pen, reason, width - 20, styles.body),
  ]);
  const height = text.height + 10;
  return [
    {
      height,
      draw(x, y) {
        box(pen, [x, y, 2.5, height], colours.held);
        text.draw(x + 10, y + 5);
      },
    },
  ];
}
