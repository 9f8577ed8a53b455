import "server-only";
import PDFDocument from "pdfkit";
import { mm } from "./print-style";

export type PageSize = { width: number; height: number };

export const paperSizes = {
  A4: { width: mm(210), height: mm(297) },
  Letter: { width: 612, height: 792 },
} as const satisfies Record<string, PageSize>;

type Facts = { title: string; author: string; subject: string; madeAt: string; program: string };

/** Without a page. Its dates come from the model, so that the same model gives the same bytes. */
export function openDocument({ title, author, subject, madeAt, program }: Facts): PDFKit.PDFDocument {
  const date = new Date(madeAt);
  return new PDFDocument({
    font: "",
    autoFirstPage: false,
    bufferPages: true,
    pdfVersion: "1.7",
    lang: "en",
    displayTitle: true,
    info: {
      Title: title,
      Author: author,
      Subject: subject,
      Creator: program,
      Producer: program,
      CreationDate: date,
      ModDate: date,
    },
  });
}

export function addPage(doc: PDFKit.PDFDocument, { width, height }: PageSize): void {
  doc.addPage({ size: [width, height], margin: 0 });
}

/** Ends the document and hands over its bytes. */
export function bytesOf(doc: PDFKit.PDFDocument): Promise<Uint8Array> {
  return new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    doc.on("data", (part: Buffer) => parts.push(part));
    doc.on("error", reject);
    doc.on("end", () => resolve(new Uint8Array(Buffer.concat(parts))));
    doc.end();
  });
}
