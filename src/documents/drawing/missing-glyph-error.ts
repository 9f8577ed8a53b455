import "server-only";

/** A sign that the fonts of the documents cannot draw. It is never dropped: the record must say what it was told. */
export class MissingGlyphError extends Error {
  override readonly name = "MissingGlyphError";

  constructor(
    readonly sign: string,
    readonly field: string,
  ) {
    super(`${field}: the sign ${describeSign(sign)} cannot be printed. Please write it in another way.`);
  }
}

function describeSign(sign: string): string {
  const code = `U+${sign.codePointAt(0)!.toString(16).toUpperCase().padStart(4, "0")}`;
  return /^[\p{C}\p{Z}\p{M}]/u.test(sign) ? code : `“${sign}” (${code})`;
}
