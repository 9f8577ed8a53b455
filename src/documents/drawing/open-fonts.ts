import "server-only";
import PDFDocument from "pdfkit";
import { readFontFile, type Script, type Weight } from "./font-files";

/** What pdfkit reads a font file into. It can be handed to any number of documents. */
export type OpenFont = { hasGlyphForCodePoint(codePoint: number): boolean };

const opened = new Map<string, OpenFont>();

/** Opened once for the life of the process: unpacking a font costs more than a page of text. */
export function openFont(script: Script, weight: Weight): OpenFont {
  const key = `${script}-${weight}`;
  const known = opened.get(key);
  if (known) return known;
  const font = readWithPdfkit(readFontFile(script, weight));
  opened.set(key, font);
  return font;
}

// pdfkit has no public way to ask a font for its signs, and nothing else here reads fonts.
function readWithPdfkit(bytes: Buffer): OpenFont {
  const reader = new PDFDocument({ font: "", autoFirstPage: false }).font(bytes);
  return (reader as unknown as { _font: { font: OpenFont } })._font.font;
}
