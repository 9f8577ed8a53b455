import "server-only";

/** A request's body, counted as it arrives; null as soon as it is longer than it may be. */
export async function readBytes(request: Request, most: number): Promise<Uint8Array | null> {
  const pieces: Uint8Array[] = [];
  let length = 0;
  for await (const piece of request.body ?? []) {
    length += piece.length;
    if (length > most) return null;
    pieces.push(piece);
  }
  return Buffer.concat(pieces, length);
}
