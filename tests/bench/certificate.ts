import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import PDFDocument from "pdfkit";
import { renderCertificate } from "../../src/documents/certificate/render-certificate";
import { readFontFile } from "../../src/documents/drawing/font-files";
import { certificateContent } from "../support/certificate-content";
import { type BenchTable, inMs, ratio, sideBySide } from "./measure";

/** Our certificate of eight injectors against the bare library writing as much text and drawing as many strokes. */
export async function benchCertificate(): Promise<BenchTable[]> {
  const content = certificateContent({ injectors: 8, widths: 7 });
  const amount = amountIn(await renderCertificate(content, new Map()));
  const font = readFontFile("latin", 400);
  const measured = await sideBySide(
    [
      { name: "certificate: laid out, checked, drawn", run: () => renderCertificate(content, new Map()) },
      { name: "bare pdfkit, as much text and as many strokes", run: () => bare(amount, font) },
    ],
    { rounds: 15 },
  );
  return [
    {
      title: `Certificate, 8 injectors, 7 pulse widths: ${amount.pages.length} pages, ${amount.words} words, ${amount.strokes} strokes`,
      head: ["", "one document", "the certificate takes"],
      rows: measured.map((way) => [way.name, inMs(way.medianMs), ratio(measured[0]!, way)]),
      notes: [
        "Both embed a subset of the same fonts. The bare document knows every place beforehand: no measuring, no page",
        "breaks, no columns, one weight and one script.",
      ],
    },
  ];
}

type Amount = { pages: string[][]; words: number; strokes: number };

/** Words by page from the text, strokes from the page's drawing commands. */
function amountIn(pdf: Uint8Array): Amount {
  const folder = mkdtempSync(join(tmpdir(), "certificate-bench-"));
  try {
    const path = join(folder, "c.pdf");
    writeFileSync(path, pdf);
    const text = execFileSync("pdftotext", ["-layout", path, "-"], { encoding: "utf8" });
    const pages = text
      .split("\f")
      .map((page) => page.split(/\s{2,}|\n/).filter((piece) => piece.trim() !== ""))
      .filter((pieces) => pieces.length > 0);
    const plain = execFileSync("qpdf", ["--qdf", "--object-streams=disable", path, "-"], {
      encoding: "latin1",
      maxBuffer: 64 * 1024 * 1024,
    });
    const strokes = plain.match(/^(?:S|f|f\*|B)$/gm)?.length ?? 0;
    return { pages, words: pages.flat().join(" ").split(/\s+/).length, strokes };
  } finally {
    rmSync(folder, { recursive: true });
  }
}

function bare({ pages, strokes }: Amount, font: Buffer): Promise<Uint8Array> {
  const doc = new PDFDocument({ font: "", autoFirstPage: false });
  const parts: Buffer[] = [];
  doc.registerFont("plain", font);
  for (const pieces of pages) {
    doc.addPage({ size: "A4", margin: 0 }).font("plain", 8);
    pieces.forEach((piece, index) => {
      doc.text(piece, 30 + 130 * (index % 4), 30 + 2.4 * index, { lineBreak: false });
    });
    for (let stroke = 0; stroke < strokes / pages.length; stroke++)
      doc
        .moveTo(30, 30 + stroke)
        .lineTo(560, 30 + stroke)
        .stroke();
  }
  return new Promise((resolve) => {
    doc.on("data", (part: Buffer) => parts.push(part));
    doc.on("end", () => resolve(new Uint8Array(Buffer.concat(parts))));
    doc.end();
  });
}
