import "server-only";
import { addPage, bytesOf, openDocument } from "../drawing/open-document";
import { makePen, type Pen } from "../drawing/pen";
import { colours, leadingOf, type TextStyle } from "../drawing/print-style";
import { qrCode } from "../drawing/qr-code";
import { type LabelSize, labelLayouts } from "./label-sizes";

export type Label = {
  /** 26-0147/3; the largest thing on it. */
  tag: string;
  /** What helps to find the right one in a box, most important first. */
  lines: string[];
};

export type Labels = {
  title: string;
  lab: string;
  madeAt: string;
  program: string;
  /** What the code leads to. */
  address: string;
  labels: Label[];
};

/** One label for each bag. @throws MissingGlyphError naming a sign that cannot be printed. */
export function renderLabels(content: Labels, size: LabelSize): Promise<Uint8Array> {
  const { page, label, margin } = labelLayouts[size];
  const doc = openDocument({
    title: content.title,
    author: content.lab,
    subject: "Bag labels",
    madeAt: content.madeAt,
    program: content.program,
  });
  const pen = makePen(doc);
  const columns = Math.max(1, Math.floor((page.width - 2 * margin) / label.width));
  const rows = Math.max(1, Math.floor((page.height - 2 * margin) / label.height));
  content.labels.forEach((each, index) => {
    const place = index % (columns * rows);
    if (place === 0) addPage(doc, page);
    const x = margin + (place % columns) * label.width;
    const y = margin + Math.floor(place / columns) * label.height;
    if (columns * rows > 1) doc.rect(x, y, label.width, label.height).lineWidth(0.3).stroke(colours.hair2);
    drawLabel(pen, { ...content, label: each }, { x, y, ...label });
  });
  return bytesOf(doc);
}

type Box = { x: number; y: number; width: number; height: number };

function drawLabel(
  pen: Pen,
  { label, lab, address }: { label: Label; lab: string; address: string },
  box: Box,
): void {
  const pad = box.height * 0.08;
  const code = qrCode(pen, address, Math.min(box.height - 2 * pad, box.width * 0.42));
  code.draw(box.x + box.width - code.height - pad, box.y + pad);
  const width = box.width - code.height - 2.5 * pad;
  const tag = fitting(pen, label.tag, width, box.height * 0.24);
  let baseline = box.y + pad + tag.size;
  pen.write(label.tag, box.x + pad, baseline, tag);
  const small: TextStyle = { size: box.height * 0.09, weight: 400, colour: colours.ink };
  for (const line of [...label.lines, lab].flatMap((text) => pen.wrap(text, width, small))) {
    baseline += leadingOf(small);
    if (baseline > box.y + box.height - pad) return;
    pen.write(line, box.x + pad, baseline, small);
  }
}

/** As large as the room allows. */
function fitting(pen: Pen, text: string, width: number, largest: number): TextStyle {
  const style: TextStyle = { size: largest, weight: 600, colour: colours.ink };
  return { ...style, size: Math.min(largest, (largest * width) / pen.measure(text, style)) };
}
