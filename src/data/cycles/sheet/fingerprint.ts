/** A short name for a text, to tell whether it is still the same (FNV-1a, twice 32 bits). Not for secrets. */
export function fingerprint(text: string): string {
  let low = 0x811c9dc5;
  let high = 0xcbf29ce4;
  for (let index = 0; index < text.length; index++) {
    const code = text.charCodeAt(index);
    low = Math.imul(low ^ code, 0x01000193) >>> 0;
    high = Math.imul(high ^ (code + index), 0x01000193) >>> 0;
  }
  return low.toString(36) + high.toString(36);
}
