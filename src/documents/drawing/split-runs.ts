import "server-only";
import { type Script, scripts, type Weight } from "./font-files";
import { MissingGlyphError } from "./missing-glyph-error";
import { openFont } from "./open-fonts";

export type Run = { script: Script; text: string };

/** Signs that show nothing of themselves, or turn what stands around them: no record may hold them unseen. */
const unseen = /^[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]$/u;

/** One line of text in pieces, each of one font file. A sign that no file has is an error that names the field. */
export function splitRuns(text: string, weight: Weight, field: string): Run[] {
  const runs: Run[] = [];
  for (const sign of text) {
    const current = runs.at(-1);
    const script = scriptOf(sign, weight, current?.script);
    if (!script) throw new MissingGlyphError(sign, field);
    if (current?.script === script) current.text += sign;
    else runs.push({ script, text: sign });
  }
  return runs;
}

/** An accent stays with its letter. All else goes to the first file: blanks in the later ones cannot be read by pdfkit. */
function scriptOf(sign: string, weight: Weight, before: Script | undefined): Script | undefined {
  if (before && /\p{M}/u.test(sign) && covers(before, sign, weight)) return before;
  return scripts.find((script) => covers(script, sign, weight));
}

/** The first sign of a text that the documents cannot print; null when all can be. Line breaks are no signs. */
export function findMissingSign(text: string): string | null {
  for (const sign of text)
    if (sign !== "\n" && !scripts.some((script) => covers(script, sign, 400))) return sign;
  return null;
}

function covers(script: Script, sign: string, weight: Weight): boolean {
  return !unseen.test(sign) && openFont(script, weight).hasGlyphForCodePoint(sign.codePointAt(0)!);
}
