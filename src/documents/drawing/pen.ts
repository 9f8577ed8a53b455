import "server-only";
import type { Script, Weight } from "./font-files";
import { openFont } from "./open-fonts";
import type { TextStyle } from "./print-style";
import { type Run, splitRuns } from "./split-runs";
import { wrapText } from "./wrap-text";

export type Align = "left" | "right" | "centre";

/** Measures and writes text on one document. */
export type Pen = {
  doc: PDFKit.PDFDocument;
  measure(text: string, style: TextStyle): number;
  wrap(text: string, width: number, style: TextStyle): string[];
  /** One line; x is its left end, its right end or its centre. */
  write(text: string, x: number, baseline: number, style: TextStyle, align?: Align): void;
};

const shares: Record<Align, number> = { left: 0, centre: 0.5, right: 1 };

export function makePen(doc: PDFKit.PDFDocument): Pen {
  const splits = new Map<string, Run[]>();

  function runsOf(text: string, weight: Weight): Run[] {
    const key = weight + text;
    const known = splits.get(key);
    if (known) return known;
    const runs = splitRuns(text, weight, "Text");
    splits.set(key, runs);
    return runs;
  }

  function widthOf({ script, text }: Run, style: TextStyle): number {
    chooseFont(doc, script, style);
    return doc.widthOfString(text);
  }

  function measure(text: string, style: TextStyle): number {
    return runsOf(text, style.weight).reduce((sum, run) => sum + widthOf(run, style), 0);
  }

  return {
    doc,
    measure,
    wrap: (text, width, style) => wrapText(text, width, (piece) => measure(piece, style)),
    write(text, x, baseline, style, align = "left") {
      let from = align === "left" ? x : x - measure(text, style) * shares[align];
      doc.fillColor(style.colour);
      for (const run of runsOf(text, style.weight)) {
        const width = widthOf(run, style);
        doc.text(run.text, from, baseline, { lineBreak: false, baseline: "alphabetic" });
        from += width;
      }
    },
  };
}

const registered = new WeakMap<PDFKit.PDFDocument, Set<string>>();

/** By name, since pdfkit embeds a font anew each time it is handed over without one. */
function chooseFont(doc: PDFKit.PDFDocument, script: Script, { weight, size }: TextStyle): void {
  const name = `${script}-${weight}`;
  const names = registered.get(doc) ?? new Set();
  registered.set(doc, names);
  if (!names.has(name)) {
    doc.registerFont(name, openFont(script, weight) as unknown as ArrayBuffer);
    names.add(name);
  }
  doc.font(name, size);
}
